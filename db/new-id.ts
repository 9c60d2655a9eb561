import { v7 } from 'uuid'

/** A new UUID v7: made by the application, in time order, so that neighbours in time are neighbours in the index. */
export function newId(): string {
  return v7()
}
