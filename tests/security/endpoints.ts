import { newId } from '@/db/new-id'
import { type Role, roles } from '@/db/permissions'

/** Things of one workroom that requests name: each endpoint is tried on them by its own people and by strangers. */
export interface Things {
  readonly clientId: string
  readonly cardId: string
  readonly draftId: string
  readonly headId: string
  readonly shareId: string
  readonly shareToken: string
  readonly invitationId: string
  readonly membershipId: string
  /** Remembered by the owner. */
  readonly printerId: string
}

/** Who gets through: anybody at all, anybody signed in, or these roles of the workroom (and nobody of another one). */
type Access = 'anybody' | 'signed-in' | readonly Role[]

export interface Endpoint {
  readonly access: Access
  /** A right input (of a GET: its query), naming things of the workroom. New for each call. */
  readonly input: (things: Things) => Record<string, unknown>
  /** Other roles are forbidden it; to these the thing is merely out of reach, and so does not exist. */
  readonly outOfReach?: readonly Role[]
  /** What a stranger's owner meets: 'not-found' when the input names things, 'own' when it only touches their own workroom. */
  readonly stranger?: 'not-found' | 'own'
  /** Of a route handler: the address, with the things in it. */
  readonly path?: (things: Things) => string
  /** Answers something other than `{ok, value}` when it lets one through. */
  readonly plain?: boolean
}

const nothing = () => ({})
const owner = ['owner'] as const
const drafters = ['owner', 'drafter'] as const

/**
 * Every route handler (`METHOD /path`) and every server action (`file#name`) of the product, and who gets through.
 * Written by hand on purpose: it must not follow from the table of permissions that it checks.
 */
export const endpoints: Readonly<Record<string, Endpoint>> = {
  'GET /api/health': { access: 'anybody', input: nothing, path: () => '/api/health', plain: true },
  'GET /api/shell': { access: 'anybody', input: nothing, path: () => '/api/shell', plain: true },
  'GET /api/auth/[...nextauth]': {
    access: 'anybody',
    input: nothing,
    path: () => '/api/auth/csrf',
    plain: true,
  },
  'POST /api/auth/[...nextauth]': {
    access: 'anybody',
    input: nothing,
    path: () => '/api/auth/callback/credentials',
    plain: true,
  },
  'GET /api/revisions/[id]/pattern.pdf': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: () => ({ paper: 'a4' }),
    path: ({ headId }) => `/api/revisions/${headId}/pattern.pdf`,
  },
  'GET /api/revisions/[id]/pattern.svg': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: nothing,
    path: ({ headId }) => `/api/revisions/${headId}/pattern.svg`,
  },
  'GET /api/revisions/[id]/chalk.pdf': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: () => ({ paper: 'letter' }),
    path: ({ headId }) => `/api/revisions/${headId}/chalk.pdf`,
  },
  'GET /api/revisions/[id]/kept': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: nothing,
    path: ({ headId }) => `/api/revisions/${headId}/kept`,
  },
  'GET /api/drafts/[id]/revisions': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: nothing,
    path: ({ draftId }) => `/api/drafts/${draftId}/revisions`,
  },
  'POST /api/drafts/[id]/revisions': {
    access: drafters,
    outOfReach: ['tutor', 'student'],
    input: ({ headId }) => ({
      revisionId: newId(),
      basedOn: headId,
      order: { garment: 'flared-dress', measurements: { bust: 930 } },
      typed: {},
      kind: 'auto',
    }),
    path: ({ draftId }) => `/api/drafts/${draftId}/revisions`,
  },
  'GET /api/drafts/[id]/revisions/[revisionId]': {
    access: drafters,
    outOfReach: ['tutor', 'maker', 'student'],
    input: nothing,
    path: ({ draftId, headId }) => `/api/drafts/${draftId}/revisions/${headId}`,
  },
  'GET /api/drafts/[id]/shares': {
    access: drafters,
    outOfReach: ['tutor'],
    input: nothing,
    path: ({ draftId }) => `/api/drafts/${draftId}/shares`,
  },
  'POST /api/drafts/[id]/shares': {
    access: drafters,
    outOfReach: ['tutor'],
    input: () => ({ shareId: newId(), scope: 'drawing', expiresOn: '2027-03-01' }),
    path: ({ draftId }) => `/api/drafts/${draftId}/shares`,
  },
  'DELETE /api/drafts/[id]/shares/[shareId]': {
    access: drafters,
    outOfReach: ['tutor'],
    input: nothing,
    path: ({ draftId, shareId }) => `/api/drafts/${draftId}/shares/${shareId}`,
  },
  'GET /api/printers': { access: roles, input: nothing, stranger: 'own', path: () => '/api/printers' },
  'POST /api/printers': {
    access: roles,
    input: () => ({ id: newId(), name: 'Upstairs', short: 98.5, long: 99.2 }),
    stranger: 'own',
    path: () => '/api/printers',
  },
  'DELETE /api/printers/[id]': {
    access: owner,
    outOfReach: ['drafter', 'tutor', 'maker', 'student'],
    input: nothing,
    path: ({ printerId }) => `/api/printers/${printerId}`,
  },
  'GET /api/shared/[token]': {
    access: 'anybody',
    input: nothing,
    path: ({ shareToken }) => `/api/shared/${shareToken}`,
  },
  'GET /api/shared/[token]/pattern.pdf': {
    access: 'anybody',
    input: () => ({ paper: 'letter' }),
    path: ({ shareToken }) => `/api/shared/${shareToken}/pattern.pdf`,
  },
  'GET /api/shared/[token]/pattern.svg': {
    access: 'anybody',
    input: nothing,
    path: ({ shareToken }) => `/api/shared/${shareToken}/pattern.svg`,
  },

  'app/(auth)/actions.ts#signOut': { access: 'anybody', input: nothing },
  'app/(auth)/actions.ts#changeWorkroom': {
    access: 'signed-in',
    input: () => ({ workroomId: newId() }),
    stranger: 'not-found',
  },
  'app/(auth)/join/actions.ts#join': {
    access: 'anybody',
    input: () => ({ email: `${newId()}@people.example`, name: 'Somebody', workroomName: 'Somewhere' }),
  },
  'app/(auth)/join/actions.ts#confirm': {
    access: 'anybody',
    input: () => ({ token: 'x', password: 'plum tree by the river', unit: 'in', timeZone: 'Africa/Lagos' }),
  },
  'app/(auth)/forgotten/actions.ts#askForReset': {
    access: 'anybody',
    input: () => ({ email: `${newId()}@people.example` }),
  },
  'app/(auth)/reset/actions.ts#reset': {
    access: 'anybody',
    input: () => ({ token: 'x', password: 'plum tree by the river' }),
  },
  'app/(auth)/invitation/actions.ts#accept': {
    access: 'anybody',
    input: () => ({ token: 'x', name: 'Somebody', password: 'plum tree by the river' }),
  },
  'app/(auth)/invitation/actions.ts#acceptKnown': { access: 'signed-in', input: () => ({ token: 'x' }) },

  'app/(workroom)/account/actions.ts#setPassword': {
    access: 'signed-in',
    input: () => ({ current: 'not the password', next: 'plum tree by the river' }),
  },
  'app/(workroom)/account/actions.ts#endSession': {
    access: 'signed-in',
    input: () => ({ id: newId() }),
    stranger: 'not-found',
  },
  'app/(workroom)/members/actions.ts#invite': {
    access: owner,
    input: () => ({ id: newId(), email: `${newId()}@people.example`, roles: ['maker'] }),
    stranger: 'own',
  },
  'app/(workroom)/members/actions.ts#withdraw': {
    access: owner,
    input: ({ invitationId }) => ({ id: invitationId }),
    stranger: 'not-found',
  },
  'app/(workroom)/members/actions.ts#setRoles': {
    access: owner,
    input: ({ membershipId }) => ({ membershipId, roles: ['maker'] }),
    stranger: 'not-found',
  },
  'app/(workroom)/members/actions.ts#setDisabled': {
    access: owner,
    input: ({ membershipId }) => ({ membershipId, disabled: false }),
    stranger: 'not-found',
  },
  'app/(workroom)/settings/actions.ts#saveSettings': {
    access: owner,
    input: () => ({
      name: 'Renamed',
      note: '',
      unit: 'in',
      currency: 'GBP',
      timeZone: 'Africa/Lagos',
      typedIn: 'in',
      'allowances.shoulder': '1/2',
      'allowances.side': '1',
      'allowances.centreBack': '1',
      'allowances.neckline': '1 cm',
      'allowances.armhole': '1 cm',
      'allowances.hem': '1',
    }),
    stranger: 'own',
  },

  'app/(workroom)/clients/actions.ts#saveClient': {
    access: drafters,
    input: ({ clientId }) => ({
      id: clientId,
      name: 'Renamed',
      email: '',
      phone: '',
      note: '',
      isNew: false,
    }),
  },
  'app/(workroom)/clients/actions.ts#archiveClient': {
    access: drafters,
    input: ({ clientId }) => ({ id: clientId, archived: true }),
  },
  'app/(workroom)/clients/actions.ts#makeBlock': {
    access: drafters,
    input: ({ draftId }) => ({ draftId }),
  },
  'app/(workroom)/clients/actions.ts#dropBlock': {
    access: drafters,
    input: ({ clientId }) => ({ clientId, garment: 'flared-dress' }),
  },
  'app/(workroom)/cards/actions.ts#saveCard': {
    access: drafters,
    input: ({ clientId }) => ({
      id: newId(),
      clientId,
      name: 'Second fitting',
      takenOn: '2026-11-20',
      unit: 'in',
      note: '',
      values: {},
      isNew: true,
    }),
  },
  'app/(workroom)/drafts/actions.ts#startDraft': {
    access: drafters,
    outOfReach: ['maker', 'student'],
    input: ({ cardId }) => ({
      id: newId(),
      revisionId: newId(),
      name: 'Another dress',
      garment: 'flared-dress',
      cardId,
    }),
  },
  'app/(workroom)/drafts/actions.ts#renameDraft': {
    access: drafters,
    outOfReach: ['tutor', 'student'],
    input: ({ draftId }) => ({ id: draftId, name: 'Renamed' }),
  },
  'app/(workroom)/drafts/actions.ts#giveDraft': {
    access: drafters,
    input: ({ draftId, membershipId }) => ({ id: draftId, membershipId }),
  },
}
