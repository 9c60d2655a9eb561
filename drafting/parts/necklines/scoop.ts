import { mostCurvedLean, neckCurve, type Neckline } from './neckline'

/** Scoop: deeper and wider than round, broad at its low part, then steeply up to the shoulder. */
export const scoop: Neckline = {
  depth: 'scoopNeckDepth',
  widening: 'scoopWidening',
  lean: (slope) => slope,
  mostLean: mostCurvedLean,
  draw: (centre, side, leaves) => neckCurve(centre, side, leaves, 0.62, 0.56),
}
