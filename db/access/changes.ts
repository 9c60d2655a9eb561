import { AccessError } from '../access-error'
import type { Actor } from '../permissions'

/** The condition under which a change is made: on the version that the person saw, and on no other. */
export function onlyOnVersion(actor: Actor, id: string, version: number) {
  return { id, workroomId: actor.workroomId, version }
}

/** Somebody else was first. Theirs stands, and what was typed is still with the person who typed it. */
export function changedMeanwhile(what: string): AccessError {
  return new AccessError(
    'conflict',
    `Somebody changed this ${what} meanwhile. Reload to see theirs, then make your change again.`,
  )
}
