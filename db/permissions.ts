import { AccessError } from './access-error'

export const roles = ['owner', 'drafter', 'tutor', 'maker', 'student'] as const
export type Role = (typeof roles)[number]

/** Who is asking: a person, signed in, in one workroom. Every access function takes one and trusts nothing else. */
export interface Actor {
  readonly userId: string
  readonly workroomId: string
  readonly membershipId: string
  readonly roles: readonly Role[]
  readonly sessionId: string
}

export type Resource =
  'clients' | 'cards' | 'drafts' | 'shares' | 'methods' | 'blocks' | 'workroom' | 'members'
export type Action = 'read' | 'write'

/**
 * How far a permission reaches inside the workroom:
 * - all: everything of the workroom
 * - assigned: drafts assigned to the member, and the clients and cards of those
 * - own: what the member made (a card: the member's own measurements)
 * - practice: the member's own practice drafts
 * - teaching: the workroom's teaching drafts
 * - shared: teaching drafts that have a live share link
 */
export type Reach = 'all' | 'assigned' | 'own' | 'practice' | 'teaching' | 'shared'

type Grants = Readonly<Partial<Record<Resource, Readonly<Partial<Record<Action, readonly Reach[]>>>>>>

const everything = { read: ['all'], write: ['all'] } as const

/** The one table of permissions: role × resource × action. What is not in it is refused. Printing a draft is reading it. */
export const permissions: Readonly<Record<Role, Grants>> = {
  owner: {
    clients: everything,
    cards: everything,
    drafts: everything,
    shares: everything,
    methods: everything,
    blocks: everything,
    workroom: everything,
    members: everything,
  },
  drafter: {
    clients: everything,
    cards: everything,
    drafts: everything,
    shares: everything,
    methods: everything,
    blocks: everything,
    workroom: { read: ['all'] },
  },
  tutor: {
    drafts: { read: ['own', 'teaching'], write: ['own'] },
    shares: { read: ['own'], write: ['own'] },
    methods: everything,
    workroom: { read: ['all'] },
  },
  maker: {
    clients: { read: ['assigned'] },
    cards: { read: ['assigned'] },
    drafts: { read: ['assigned'] },
    methods: { read: ['all'] },
    workroom: { read: ['all'] },
  },
  student: {
    cards: { read: ['own'], write: ['own'] },
    drafts: { read: ['practice', 'shared'], write: ['practice'] },
    methods: { read: ['all'] },
    workroom: { read: ['all'] },
  },
}

/** Everything the actor's roles together reach; empty when nothing. */
export function reachOf(actor: Pick<Actor, 'roles'>, resource: Resource, action: Action): ReadonlySet<Reach> {
  return new Set(actor.roles.flatMap((role) => permissions[role][resource]?.[action] ?? []))
}

/** @throws AccessError forbidden when none of the actor's roles may do this at all. */
export function requireReach(actor: Actor, resource: Resource, action: Action): ReadonlySet<Reach> {
  const reach = reachOf(actor, resource, action)
  if (reach.size === 0)
    throw new AccessError('forbidden', 'Your role in this workroom does not allow this. Ask its owner.')
  return reach
}

/** For pages that show or hide a button; the access functions decide for themselves. */
export function may(actor: Pick<Actor, 'roles'>, resource: Resource, action: Action): boolean {
  return reachOf(actor, resource, action).size > 0
}
