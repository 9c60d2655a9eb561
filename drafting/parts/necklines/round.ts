import { mostCurvedLean, neckCurve, type Neckline } from './neckline'

/** Round: square at the centre for a short way, widest low, square to the shoulder. */
export const round: Neckline = {
  depth: 'frontNeckDepth',
  widening: 'neckWidening',
  takesCollar: 'any',
  lean: (slope) => slope,
  mostLean: mostCurvedLean,
  draw: (centre, side, leaves) => neckCurve(centre, side, leaves, 0.52, 0.48),
}
