import 'server-only'
import { Op, type Transaction, UniqueConstraintError, type WhereOptions } from 'sequelize'
import { AccessError, notFound } from '../access-error'
import { checkInput } from '../check-input'
import { Client } from '../models/client'
import { MeasureCard } from '../models/measure-card'
import { MeasureValue } from '../models/measure-value'
import { type Action, type Actor, requireReach } from '../permissions'
import { type CardChange, type CardInput, cardChangeShape, cardShape } from '../shapes/card'
import type { Length, Unit } from '../shapes/length'
import { inTransaction } from '../transactions'
import { knownId } from './known-id'
import { assignedTo } from './reaches'

export interface Card {
  readonly id: string
  /** null on a member's own card. */
  readonly clientId: string | null
  readonly name: string
  /** YYYY-MM-DD */
  readonly takenOn: string
  readonly unit: Unit
  readonly note: string
  /** By measurement id. */
  readonly values: Readonly<Record<string, Length>>
  readonly updatedAt: string
}

function plain(card: MeasureCard, values: readonly MeasureValue[]): Card {
  const { id, clientId, name, takenOn, unit, note } = card
  const own = values
    .filter((value) => value.cardId === id)
    .map((value) => [value.measurement, { mm: Number(value.mm), typed: value.typed, unit: value.unit }])
  return {
    id,
    clientId,
    name,
    takenOn,
    unit,
    note,
    values: Object.fromEntries(own),
    updatedAt: card.updatedAt.toISOString(),
  }
}

async function cardsWithin(actor: Actor, action: Action): Promise<WhereOptions<MeasureCard>> {
  const reach = requireReach(actor, 'cards', action)
  const { workroomId, membershipId } = actor
  const ways: WhereOptions<MeasureCard>[] = [{ membershipId }]
  if (reach.has('all')) ways.push({ clientId: { [Op.ne]: null } })
  if (reach.has('assigned')) ways.push({ id: { [Op.in]: (await assignedTo(actor)).cardIds } })
  return { workroomId, [Op.or]: ways }
}

async function withValues(cards: MeasureCard[], transaction?: Transaction): Promise<Card[]> {
  const values = await MeasureValue.findAll({
    where: { cardId: { [Op.in]: cards.map((card) => card.id) } },
    transaction,
  })
  return cards.map((card) => plain(card, values))
}

/** The cards of a client, newest first; with null the member's own. */
export async function listCards(actor: Actor, clientId: string | null): Promise<Card[]> {
  const cards = await MeasureCard.findAll({
    where: {
      [Op.and]: [
        await cardsWithin(actor, 'read'),
        clientId === null ? { membershipId: actor.membershipId } : { clientId: knownId(clientId, 'client') },
      ],
    },
    order: [
      ['takenOn', 'desc'],
      ['id', 'desc'],
    ],
  })
  return withValues(cards)
}

/** @throws AccessError not-found */
export async function getCard(actor: Actor, id: string): Promise<Card> {
  const card = await MeasureCard.findOne({
    where: { [Op.and]: [await cardsWithin(actor, 'read'), { id: knownId(id, 'measure card') }] },
  })
  if (!card) throw notFound('measure card')
  const [found] = await withValues([card])
  if (!found) throw notFound('measure card')
  return found
}

const rowsOf = (workroomId: string, cardId: string, values: Readonly<Record<string, Length>>) =>
  Object.entries(values).map(([measurement, { mm, typed, unit }]) => ({
    workroomId,
    cardId,
    measurement,
    mm: mm.toFixed(3),
    typed,
    unit,
  }))

async function requireOwner(actor: Actor, clientId: string | null): Promise<void> {
  const reach = requireReach(actor, 'cards', 'write')
  if (clientId === null) return
  if (!reach.has('all')) throw new AccessError('forbidden', 'You may write your own measurements only.')
  const client = await Client.findOne({ where: { id: clientId, workroomId: actor.workroomId } })
  if (!client) throw notFound('client')
}

/**
 * Adds a measure card under an id made by the caller; the same id again is a retry and changes nothing.
 * @throws AccessError not-found when the client is not of this workroom
 */
export async function createCard(actor: Actor, input: CardInput): Promise<Card> {
  const { values, clientId, ...card } = checkInput(cardShape, input)
  await requireOwner(actor, clientId)
  const { workroomId, membershipId } = actor
  try {
    await inTransaction(async (transaction) => {
      await MeasureCard.create(
        { ...card, clientId, membershipId: clientId === null ? membershipId : null, workroomId },
        { transaction },
      )
      await MeasureValue.bulkCreate(rowsOf(workroomId, card.id, values), { transaction })
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
  }
  return getCard(actor, card.id)
}

/** Replaces a card's details and all its measurements. @throws AccessError not-found */
export async function updateCard(actor: Actor, input: CardChange): Promise<Card> {
  const { values, id, ...details } = checkInput(cardChangeShape, input)
  const within = await cardsWithin(actor, 'write')
  await inTransaction(async (transaction) => {
    const card = await MeasureCard.findOne({
      where: { [Op.and]: [within, { id }] },
      lock: transaction.LOCK.UPDATE,
      transaction,
    })
    if (!card) throw notFound('measure card')
    card.changed('updatedAt', true)
    await card.update({ ...details, updatedAt: new Date() }, { transaction })
    await MeasureValue.destroy({ where: { cardId: id }, transaction })
    await MeasureValue.bulkCreate(rowsOf(actor.workroomId, id, values), { transaction })
  })
  return getCard(actor, id)
}
