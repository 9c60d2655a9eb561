/**
 * Fills an empty database with the demo workroom, once: run again it changes nothing. Needs DATABASE_URL and
 * DEMO_PASSWORD; the last line it prints lists the sign-ins as JSON.
 */
import { v5 } from 'uuid'
import { createCard } from '../access/cards'
import { createClient } from '../access/clients'
import { assignDraft } from '../access/assigning'
import { createDraft } from '../access/drafts'
import { connection } from '../connection'
import { Membership } from '../models/membership'
import { MembershipRole } from '../models/membership-role'
import { User } from '../models/user'
import { Workroom } from '../models/workroom'
import { hashPassword } from '../passwords'
import type { Actor } from '../permissions'
import { usualAllowances } from '../shapes/workroom'
import { inTransaction } from '../transactions'
import { parseLength } from '../../drafting/lengths'
import { assigned, bodies, clients, drafts, measured, people, workroomName, workroomNote } from './invented'

/** Ids follow from names, so that the seed finds again what it has made. */
const idOf = (name: string) => v5(name, 'a3a5d7c2-0b5e-5a39-9d1b-3f8e2f6f9b10')
const workroomId = idOf('workroom')

type Key = (typeof people)[number]['key']

function actorFor(key: Key): Actor {
  const { roles } = people.find((person) => person.key === key) ?? people[0]
  const membershipId = idOf(`membership ${key}`)
  return { userId: idOf(`user ${key}`), workroomId, membershipId, roles, sessionId: idOf('no session') }
}

async function seedPeople(passwordHash: string): Promise<void> {
  await inTransaction(async (transaction) => {
    await Workroom.create(
      {
        id: workroomId,
        name: workroomName,
        note: workroomNote,
        unit: 'in',
        currency: 'GBP',
        timeZone: 'Europe/London',
        allowances: usualAllowances,
      },
      { transaction },
    )
    for (const { key, name, email, roles } of people) {
      const { userId, membershipId } = actorFor(key)
      await User.create({ id: userId, name, email, passwordHash, disabledAt: null }, { transaction })
      await Membership.create({ id: membershipId, workroomId, userId, disabledAt: null }, { transaction })
      await MembershipRole.bulkCreate(
        roles.map((role) => ({ membershipId, role, workroomId })),
        { transaction },
      )
    }
  })
}

function valuesOf(body: keyof typeof bodies) {
  const column = bodies[body].split('|').map((text) => text.trim())
  return Object.fromEntries(
    measured.map((id, place) => {
      const typed = column[place] ?? ''
      return [id, { mm: parseLength(typed, 'in', id), typed, unit: 'in' as const }]
    }),
  )
}

const card = (name: string, takenOn: string, body: keyof typeof bodies) => ({
  name: `Measured ${takenOn}`,
  id: idOf(`card ${name}`),
  takenOn,
  unit: 'in' as const,
  note: '',
  values: valuesOf(body),
})

async function seedClients(): Promise<void> {
  for (const { name, phone, note, body, takenOn } of clients) {
    const id = idOf(`client ${name}`)
    await createClient(actorFor('owner'), { id, name, email: '', phone, note: `Invented. ${note}`.trim() })
    await createCard(actorFor('owner'), { ...card(name, takenOn, body), clientId: id })
  }
  await createCard(actorFor('student'), { ...card('student', '2026-11-25', 'small'), clientId: null })
}

async function seedDrafts(): Promise<void> {
  for (const { name, garment, client, by, purpose } of drafts) {
    const body = clients.find((each) => each.name === client)?.body ?? 'small'
    const values = Object.entries(valuesOf(body))
    await createDraft(actorFor(by), {
      id: idOf(`draft ${name}`),
      revisionId: idOf(`revision ${name}`),
      name,
      purpose,
      clientId: client && idOf(`client ${client}`),
      cardId: client ? idOf(`card ${client}`) : by === 'student' ? idOf('card student') : null,
      order: {
        garment,
        unit: 'in',
        measurements: Object.fromEntries(values.map(([id, { mm }]) => [id, mm])),
      },
    })
  }
  await assignDraft(actorFor('owner'), idOf(`draft ${assigned}`), actorFor('maker').membershipId)
}

async function seed(): Promise<void> {
  const password = process.env.DEMO_PASSWORD
  if (!password) throw new Error('DEMO_PASSWORD is not set.')
  if ((await Workroom.count({ where: { id: workroomId } })) === 0)
    await seedPeople(await hashPassword(password))
  // Each of these has its own fixed id: what a broken run left out is made up for, the rest stays as it is.
  await seedClients()
  await seedDrafts()
}

try {
  await seed()
  process.stdout.write(
    `${JSON.stringify(people.map(({ name, email, roles }) => ({ name, email, roles })))}\n`,
  )
} finally {
  await connection.close()
}
