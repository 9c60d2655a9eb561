import 'server-only'
import { invitationLink } from '@/db/access/invitations'
import { joinLink } from '@/db/access/joining'
import { resetLink } from '@/db/access/new-passwords'
import type { JobPayloads } from '@/db/access/outbox'
import { appOrigin } from '../config'
import type { Letter } from './letter'

/** An address inside Chalkfold, from the configured origin. */
function address(path: string, token?: string): string {
  const url = new URL(path, appOrigin())
  if (token !== undefined) url.searchParams.set('token', token)
  return url.href
}

/** Names stand in subjects and greetings: one line each. */
const named = (name: string) => name.replace(/\s+/g, ' ').trim()

/** To somebody who joins: the link to confirm by, or, when they have an account already, how to get in. */
export async function joinLetter(jobId: string, wanted: JobPayloads['mail-join']): Promise<Letter> {
  const token = await joinLink(jobId, wanted)
  const reason =
    'You get this because this address was given to join Chalkfold. If it was not you, do nothing.'
  const greeting = `Hello ${named(wanted.name)},`
  if (token === null)
    return {
      to: wanted.email,
      subject: 'You have a Chalkfold account already',
      greeting,
      paragraphs: [
        'Somebody, probably you, asked to join Chalkfold with this address. You have an account already: sign in with it.',
        'If you forgot the password, choose a new one on the sign-in page.',
      ],
      link: { words: 'Sign in', url: address('/sign-in') },
      reason,
    }
  return {
    to: wanted.email,
    subject: 'Confirm your address to open your workroom',
    greeting,
    paragraphs: [
      `Your workroom "${named(wanted.workroomName)}" is nearly ready. The link works once, for a day.`,
    ],
    link: { words: 'Choose a password and open the workroom', url: address('/join/confirm', token) },
    reason,
  }
}

/** To somebody who forgot the password. An address that nobody signs in with is told so. */
export async function resetLetter(jobId: string, { email }: JobPayloads['mail-reset']): Promise<Letter> {
  const known = await resetLink(jobId, email)
  const reason = 'You get this because a new password was asked for. If it was not you, do nothing.'
  if (!known)
    return {
      to: email,
      subject: 'No Chalkfold account with this address',
      greeting: 'Hello,',
      paragraphs: [
        'A new password was asked for, but nobody signs in to Chalkfold with this address. Perhaps you used another one.',
      ],
      reason,
    }
  return {
    to: email,
    subject: 'Choose a new password',
    greeting: `Hello ${named(known.name)},`,
    paragraphs: ['The link works once, for an hour. Your old password works until then.'],
    link: { words: 'Choose a new password', url: address('/reset', known.token) },
    reason,
  }
}

/** After a password was changed, so that a stranger's change does not go unseen. */
export function passwordChangedLetter({ email, name }: JobPayloads['mail-password-changed']): Letter {
  return {
    to: email,
    subject: 'Your password was changed',
    greeting: `Hello ${named(name)},`,
    paragraphs: [
      'Your Chalkfold password was changed, and every device was signed out.',
      'If it was not you, choose a new password at once.',
    ],
    link: { words: 'Choose a new password', url: address('/forgotten') },
    reason: 'You get this because the password of your account was changed.',
  }
}

/** To somebody who is invited to a workroom; null when the invitation was withdrawn or used meanwhile. */
export async function invitationLetter({ tokenId }: JobPayloads['mail-invitation']): Promise<Letter | null> {
  const invitation = await invitationLink(tokenId)
  if (!invitation) return null
  const [workroom, inviter] = [named(invitation.workroomName), named(invitation.invitedBy)]
  return {
    to: invitation.email,
    subject: `${inviter} invites you to ${workroom}`,
    greeting: 'Hello,',
    paragraphs: [
      `${inviter} invites you to the workroom "${workroom}" on Chalkfold, as ${invitation.roles.join(' and ')}.`,
      'The link works once, for a week.',
    ],
    link: { words: 'Accept the invitation', url: address('/invitation', invitation.token) },
    reason: `You get this because ${inviter} gave this address. If you do not know them, do nothing.`,
  }
}
