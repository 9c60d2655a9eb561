import { arm } from './tape/arm'
import { bustAndBack } from './tape/bust-and-back'
import { neckAndShoulder } from './tape/neck-and-shoulder'
import { waistAndHip } from './tape/waist-and-hip'
import { wholeBody } from './tape/whole-body'
import type { TapeMeasurement } from './tape-measurement'

/**
 * Every measurement a garment may ask for, from the head down to the floor. Definitions follow ISO 8559-1:2017 in our own
 * words, apart from the waist, which is the natural one. Ranges join those of ANSUR II (women, 2012), NHANES 2017–2020 (women
 * from 18) and a Spanish sample of 600, a little widened; where none has the measurement they are expert judgement.
 */
export const measurements: readonly TapeMeasurement[] = [
  ...neckAndShoulder,
  ...bustAndBack,
  ...arm,
  ...waistAndHip,
  ...wholeBody,
].sort((a, b) => a.level - b.level)

const byId: ReadonlyMap<string, TapeMeasurement> = new Map(measurements.map((one) => [one.id, one]))

/** The measurement of that id, or undefined when it is none of ours. */
export function measurementById(id: string): TapeMeasurement | undefined {
  return byId.get(id)
}
