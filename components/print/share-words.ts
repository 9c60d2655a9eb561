/** What a link lets a visitor see. */
export type ShareScope = 'drawing' | 'lesson'

/** A link that was made, as the list shows it. The link itself is shown only when it is made. */
export interface MadeShare {
  readonly id: string
  readonly scope: ShareScope
  /** YYYY-MM-DD: the last day on which it works. */
  readonly expiresOn: string
  readonly state: 'live' | 'expired' | 'revoked'
  readonly createdAt: string
}

export const scopeNames: Readonly<Record<ShareScope, string>> = { drawing: 'Drawing', lesson: 'Lesson' }

export const scopeWords: Readonly<Record<ShareScope, string>> = {
  drawing: 'The pieces, the lengths on them and the seam checks. No sums, no measurements, no client.',
  lesson: 'The same, with every step and the sum behind it. No client.',
}

export const stateWords: Readonly<Record<MadeShare['state'], string>> = {
  live: 'works',
  expired: 'has run out',
  revoked: 'was taken back',
}

/** '14 March 2027' */
export function dayInWords(day: string): string {
  return new Date(`${day}T12:00:00Z`).toLocaleDateString('en-GB', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  })
}

/** The day so many days from now, as YYYY-MM-DD where the person is. */
export function dayAhead(days: number, now = new Date()): string {
  const day = new Date(now.getFullYear(), now.getMonth(), now.getDate() + days, 12)
  return [day.getFullYear(), day.getMonth() + 1, day.getDate()]
    .map((part) => String(part).padStart(2, '0'))
    .join('-')
}
