/** A finite number. */
export const isNumber = (value: unknown): value is number =>
  typeof value === 'number' && Number.isFinite(value)

/** An object with named values, not a list. */
export const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
