import type { MeasurementDefinition } from '../contract'

export type TapeKind = 'girth' | 'width' | 'length'

/** A measurement with its place on the body, so that it can hang at that height beside a drawn tape. */
export interface TapeMeasurement extends MeasurementDefinition {
  readonly kind: TapeKind
  /** Share of the body's height below the crown, 0…1, where it is taken or where it ends. */
  readonly level: number
  readonly group: 'neck and shoulder' | 'bust and back' | 'waist and hip' | 'arm' | 'whole body'
}

/** min, max in cm as tables print them; everything else in the engine is mm. */
export type Centimetres = readonly [min: number, max: number]

type Group = TapeMeasurement['group']

interface Description {
  readonly name: string
  readonly how: string
  readonly standard?: string
  /** cm: the least and the most that is accepted. */
  readonly range: Centimetres
  readonly level: number
}

/** One measurement of a group, from its description. */
export function taken(id: string, kind: TapeKind, group: Group, description: Description): TapeMeasurement {
  const { range, ...rest } = description
  return { id, kind, group, ...rest, min: range[0] * 10, max: range[1] * 10 }
}
