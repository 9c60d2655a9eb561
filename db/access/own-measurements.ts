import 'server-only'
import { Op, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { parseFormula } from '../../drafting/rules'
import type { OwnMeasurement as Definition } from '../../drafting/contract'
import { AccessError, invalid, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { DraftingMethod } from '../models/drafting-method'
import { OwnMeasurement } from '../models/own-measurement'
import { type Action, type Actor, requireReach } from '../permissions'
import type { Length } from '../shapes/length'
import {
  type OwnMeasurementChange,
  type OwnMeasurementInput,
  ownMeasurementChangeShape,
  ownMeasurementShape,
} from '../shapes/own-measurement'
import { changedMeanwhile, onlyOnVersion } from './changes'
import { knownId } from './known-id'

export interface WorkroomMeasurement {
  readonly id: string
  /** What formulas and cards call it. */
  readonly measurement: string
  readonly name: string
  readonly how: string
  /** Among those of the workroom, from 0. */
  readonly place: number
  readonly least: Length
  readonly most: Length
  readonly version: number
  readonly archived: boolean
}

function plain(row: OwnMeasurement): WorkroomMeasurement {
  const { id, measurement, name, how, place, least, most, version, archivedAt } = row
  return { id, measurement, name, how, place, least, most, version, archived: archivedAt !== null }
}

function measurementsWithin(actor: Actor, action: Action): WhereOptions<OwnMeasurement> {
  requireReach(actor, 'methods', action)
  return { workroomId: actor.workroomId }
}

async function findMeasurement(actor: Actor, id: string, action: Action): Promise<OwnMeasurement> {
  const where = { ...measurementsWithin(actor, action), id: knownId(id, 'measurement') }
  const row = await OwnMeasurement.findOne({ where })
  if (!row) throw notFound('measurement')
  return row
}

/** The workroom's own measurements in the order it takes them; archived ones only when asked for. */
export async function listOwnMeasurements(
  actor: Actor,
  { archived = false } = {},
): Promise<WorkroomMeasurement[]> {
  const found = await OwnMeasurement.findAll({
    where: { ...measurementsWithin(actor, 'read'), archivedAt: archived ? { [Op.ne]: null } : null },
    order: [
      ['place', 'asc'],
      ['name', 'asc'],
      ['id', 'asc'],
    ],
  })
  return found.map(plain)
}

/** The same as the engine takes them: what an order brings along so that its formulas can be worked out. */
export async function engineMeasurements(actor: Actor): Promise<Definition[]> {
  const own = await listOwnMeasurements(actor)
  return own.map(({ measurement, name, how, least, most }) => ({
    id: measurement,
    name,
    how,
    min: least.mm,
    max: most.mm,
  }))
}

/** @throws AccessError not-found, also for one of another workroom */
export async function getOwnMeasurement(actor: Actor, id: string): Promise<WorkroomMeasurement> {
  return plain(await findMeasurement(actor, id, 'read'))
}

/**
 * Adds a measurement under an id made by the caller; the same id again is a retry and changes nothing.
 * @throws AccessError invalid (its short name is taken), conflict
 */
export async function createOwnMeasurement(
  actor: Actor,
  input: OwnMeasurementInput,
): Promise<WorkroomMeasurement> {
  requireReach(actor, 'methods', 'write')
  const row = checkInput(ownMeasurementShape, input)
  const { workroomId } = actor
  try {
    return plain(await OwnMeasurement.create({ ...row, workroomId, version: 1, archivedAt: null }))
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    const existing = await OwnMeasurement.findOne({ where: { id: row.id, workroomId } })
    if (existing) return plain(existing)
    if (await OwnMeasurement.count({ where: { measurement: row.measurement, workroomId } }))
      throw invalid('measurement', 'The workroom has a measurement of this short name. Choose another.')
    throw new AccessError('conflict', 'This id is taken. Reload the page and try again.')
  }
}

/**
 * Changes what a measurement is called, how and when it is taken, and its range. What was measured stays.
 * @throws AccessError not-found, invalid, conflict (somebody else changed it meanwhile)
 */
export async function updateOwnMeasurement(
  actor: Actor,
  input: OwnMeasurementChange,
): Promise<WorkroomMeasurement> {
  const { id, version, ...details } = checkInput(ownMeasurementChangeShape, input)
  const row = await findMeasurement(actor, id, 'write')
  const [changed] = await OwnMeasurement.update(
    { ...details, version: version + 1 },
    { where: onlyOnVersion(actor, row.id, version) },
  )
  if (changed === 0) throw changedMeanwhile('measurement')
  return plain(await findMeasurement(actor, id, 'read'))
}

/** Names of the workroom's live methods with a formula that uses a measurement. */
async function methodsThatUse(actor: Actor, measurement: string): Promise<string[]> {
  const methods = await DraftingMethod.findAll({ where: { workroomId: actor.workroomId, archivedAt: null } })
  return methods
    .filter(({ garments }) =>
      Object.values(garments).some((rules) =>
        rules.some(({ formula }) => parseFormula(formula).names.includes(measurement)),
      ),
    )
    .map(({ name }) => name)
}

/**
 * Takes a measurement out of the lists, or back in. Cards keep what was measured.
 * @throws AccessError not-found; invalid while a method of the workroom uses it
 */
export async function archiveOwnMeasurement(
  actor: Actor,
  id: string,
  archived = true,
): Promise<WorkroomMeasurement> {
  const row = await findMeasurement(actor, id, 'write')
  const users = archived ? await methodsThatUse(actor, row.measurement) : []
  if (users.length > 0)
    throw invalid('id', `The method ${users.join(' and ')} uses it. Change the method or archive that first.`)
  return plain(await row.update({ archivedAt: archived ? new Date() : null }))
}
