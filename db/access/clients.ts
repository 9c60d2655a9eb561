import 'server-only'
import { Op, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { AccessError, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Client } from '../models/client'
import { type Action, type Actor, requireReach } from '../permissions'
import { type ClientInput, type ClientListInput, clientListShape, clientShape } from '../shapes/client'
import { knownId } from './known-id'
import { type Listed, containing, listed, pageWindow } from './pages'
import { assignedTo } from './reaches'

export interface ClientDetails {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly phone: string
  readonly note: string
  readonly archived: boolean
  readonly updatedAt: string
}

function plain(client: Client): ClientDetails {
  const { id, name, email, phone, note } = client
  return {
    id,
    name,
    email,
    phone,
    note,
    archived: client.archivedAt !== null,
    updatedAt: client.updatedAt.toISOString(),
  }
}

async function clientsWithin(actor: Actor, action: Action): Promise<WhereOptions<Client>> {
  const reach = requireReach(actor, 'clients', action)
  const { workroomId } = actor
  if (reach.has('all')) return { workroomId }
  return { workroomId, id: { [Op.in]: (await assignedTo(actor)).clientIds } }
}

/** A page of the workroom's clients; archived ones only when asked for. */
export async function listClients(actor: Actor, input: ClientListInput = {}): Promise<Listed<ClientDetails>> {
  const { search, sort, direction, archived, page } = checkInput(clientListShape, input)
  const found: WhereOptions<Client> = search
    ? {
        [Op.or]: (['name', 'email', 'phone'] as const).map((field) => ({
          [field]: { [Op.like]: containing(search) },
        })),
      }
    : {}
  const { rows, count } = await Client.findAndCountAll({
    where: {
      [Op.and]: [
        await clientsWithin(actor, 'read'),
        found,
        { archivedAt: archived ? { [Op.ne]: null } : null },
      ],
    },
    order: [
      [sort, direction],
      ['id', 'asc'],
    ],
    ...pageWindow(page),
  })
  return listed(rows.map(plain), count, page)
}

/** @throws AccessError not-found, also for a client of another workroom. */
export async function getClient(actor: Actor, id: string): Promise<ClientDetails> {
  const client = await Client.findOne({
    where: { [Op.and]: [await clientsWithin(actor, 'read'), { id: knownId(id, 'client') }] },
  })
  if (!client) throw notFound('client')
  return plain(client)
}

/** Adds a client under an id made by the caller; the same id again is a retry and changes nothing. */
export async function createClient(actor: Actor, input: ClientInput): Promise<ClientDetails> {
  const client = checkInput(clientShape, input)
  requireReach(actor, 'clients', 'write')
  try {
    return plain(await Client.create({ ...client, workroomId: actor.workroomId, archivedAt: null }))
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    const existing = await Client.findOne({ where: { id: client.id, workroomId: actor.workroomId } })
    if (existing) return plain(existing)
    throw new AccessError('conflict', 'This id is taken. Reload the page and try again.')
  }
}

/** Replaces what is known about a client. @throws AccessError not-found */
export async function updateClient(actor: Actor, input: ClientInput): Promise<ClientDetails> {
  const { id, ...details } = checkInput(clientShape, input)
  const client = await Client.findOne({
    where: { [Op.and]: [await clientsWithin(actor, 'write'), { id: knownId(id, 'client') }] },
  })
  if (!client) throw notFound('client')
  return plain(await client.update(details))
}

/** Takes a client out of the lists, or back in. Nothing is lost. @throws AccessError not-found */
export async function archiveClient(actor: Actor, id: string, archived = true): Promise<ClientDetails> {
  const client = await Client.findOne({
    where: { [Op.and]: [await clientsWithin(actor, 'write'), { id: knownId(id, 'client') }] },
  })
  if (!client) throw notFound('client')
  return plain(await client.update({ archivedAt: archived ? new Date() : null }))
}
