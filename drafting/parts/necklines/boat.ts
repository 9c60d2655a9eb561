import { mostCurvedLean, neckCurve, type Neckline } from './neckline'

/** Boat: wide and nearly level, turning up to the shoulder at its end. */
export const boat: Neckline = {
  depth: 'boatNeckDepth',
  widening: 'boatWidening',
  lean: (slope) => slope,
  mostLean: mostCurvedLean,
  draw: (centre, side, leaves) => neckCurve(centre, side, leaves, 0.52, 0.52),
}
