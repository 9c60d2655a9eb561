/** Words joined by underscores. Names of the engine's are written in one word, so the two can never be confused. */
const ownName = /^[a-z][a-z0-9]*(?:_[a-z0-9]+)+$/

/** Whether a name can be that of a workroom's own measurement. At most 40 characters. */
export function isOwnName(id: unknown): id is string {
  return typeof id === 'string' && id.length <= 40 && ownName.test(id)
}
