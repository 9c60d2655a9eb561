import 'server-only'
import { Op, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { checkMethodRules, methods as builtIn } from '../../drafting'
import type { DraftingMethod as Method } from '../../drafting/contract'
import { AccessError, invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { DraftingMethod } from '../models/drafting-method'
import { type Action, type Actor, requireReach } from '../permissions'
import {
  type MethodChange,
  type MethodCopy,
  type MethodInput,
  methodChangeShape,
  methodCopyShape,
  methodShape,
} from '../shapes/method'
import { changedMeanwhile, onlyOnVersion } from './changes'
import { knownId } from './known-id'
import { engineMeasurements } from './own-measurements'

export interface WorkroomMethod extends Method {
  /** Raised by every change. A draft keeps the version that it was drawn by, and its rules. */
  readonly version: number
  readonly copiedFrom: string | null
  readonly archived: boolean
  readonly updatedAt: string
}

function plain(method: DraftingMethod): WorkroomMethod {
  const { id, name, description, garments, version, copiedFrom, archivedAt, updatedAt } = method
  const archived = archivedAt !== null
  return {
    id,
    name,
    description,
    garments,
    version,
    copiedFrom,
    archived,
    updatedAt: updatedAt.toISOString(),
  }
}

function methodsWithin(actor: Actor, action: Action): WhereOptions<DraftingMethod> {
  requireReach(actor, 'methods', action)
  return { workroomId: actor.workroomId }
}

async function findMethod(actor: Actor, id: string, action: Action): Promise<DraftingMethod> {
  const where = { ...methodsWithin(actor, action), id: knownId(id, 'drafting method') }
  const method = await DraftingMethod.findOne({ where })
  if (!method) throw notFound('drafting method')
  return method
}

/** @throws AccessError invalid, with every formula at fault at its field 'garments.<garment>.<rule>' */
async function requireGoodRules(actor: Actor, garments: Method['garments']): Promise<void> {
  const [first, ...rest] = checkMethodRules(garments, await engineMeasurements(actor))
  if (!first) return
  const problems = [first, ...rest].map(({ field, message }) => ({ field, message }))
  throw new AccessError('invalid', first.message, problems)
}

/** The workroom's own methods by name, without the built-in ones; archived ones only when asked for. */
export async function listMethods(actor: Actor, { archived = false } = {}): Promise<WorkroomMethod[]> {
  const found = await DraftingMethod.findAll({
    where: { ...methodsWithin(actor, 'read'), archivedAt: archived ? { [Op.ne]: null } : null },
    order: [
      ['name', 'asc'],
      ['id', 'asc'],
    ],
  })
  return found.map(plain)
}

/** @throws AccessError not-found, also for a method of another workroom */
export async function getMethod(actor: Actor, id: string): Promise<WorkroomMethod> {
  return plain(await findMethod(actor, id, 'read'))
}

async function addMethod(
  actor: Actor,
  method: Pick<DraftingMethod, 'id' | 'name' | 'description' | 'garments' | 'copiedFrom'>,
): Promise<WorkroomMethod> {
  const { workroomId } = actor
  try {
    return plain(await DraftingMethod.create({ ...method, workroomId, version: 1, archivedAt: null }))
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    const existing = await DraftingMethod.findOne({ where: { id: method.id, workroomId } })
    if (existing) return plain(existing)
    throw new AccessError('conflict', 'This id is taken. Reload the page and try again.')
  }
}

/**
 * Adds a method under an id made by the caller; the same id again is a retry and changes nothing.
 * @throws AccessError invalid, with every formula at fault at its field
 */
export async function createMethod(actor: Actor, input: MethodInput): Promise<WorkroomMethod> {
  requireReach(actor, 'methods', 'write')
  const method = checkInput(methodShape, input)
  await requireGoodRules(actor, method.garments)
  return addMethod(actor, { ...method, copiedFrom: null })
}

/**
 * Adds the workroom's own copy of a built-in method, to be changed.
 * @throws AccessError invalid when there is no such method
 */
export async function copyMethod(actor: Actor, input: MethodCopy): Promise<WorkroomMethod> {
  requireReach(actor, 'methods', 'write')
  const { id, name, from } = checkInput(methodCopyShape, input)
  const source = builtIn.find((method) => method.id === from)
  if (!source) throw invalid('from', 'Choose a method from the list.')
  const { description, garments } = source
  return addMethod(actor, { id, name, description, garments, copiedFrom: from })
}

/**
 * Replaces a method. Drafts that follow it keep the rules they were drawn by.
 * @throws AccessError not-found, invalid, conflict (somebody else changed it meanwhile)
 */
export async function updateMethod(actor: Actor, input: MethodChange): Promise<WorkroomMethod> {
  const { id, version, ...details } = checkInput(methodChangeShape, input)
  const method = await findMethod(actor, id, 'write')
  await requireGoodRules(actor, details.garments)
  const [changed] = await DraftingMethod.update(
    { ...details, version: version + 1 },
    { where: onlyOnVersion(actor, method.id, version) },
  )
  if (changed === 0) throw changedMeanwhile('drafting method')
  return plain(await findMethod(actor, id, 'read'))
}

/** Takes a method out of the lists, or back in. Nothing is lost. @throws AccessError not-found */
export async function archiveMethod(actor: Actor, id: string, archived = true): Promise<WorkroomMethod> {
  const method = await findMethod(actor, id, 'write')
  return plain(await method.update({ archivedAt: archived ? new Date() : null }))
}
