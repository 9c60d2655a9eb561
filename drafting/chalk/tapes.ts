import type { Unit } from '../contract'

/** Between two marks of the tape that a chalk guide is drafted on, mm. */
export const tapes: Readonly<Record<Unit, number>> = { in: 25.4 / 8, cm: 5 }
