import type { Path, Point } from '../contract'
import { add, cubic, openPath, scale } from '../geometry'

/** How full one half of a sleeve head is: the front bulges higher and is scooped deeper than the back. */
export interface Fullness {
  /** Where the curve crosses its chord, share from the crown. */
  readonly cross: number
  /** How much steeper than the chord it crosses it: the part of `leanUnit` at the chord's angle. */
  readonly lean: number
  /** Roundness of the part above the chord, 0…1. */
  readonly out: number
  /** Depth of the scoop below the chord, 0…1. */
  readonly scoop: number
}

/** Common practice, no published source: guide points 1.8 out and 1.3 in on the front chord, 1.6 out and 0.6 in on the back. */
export const frontFullness: Fullness = { cross: 0.53, lean: 0.84, out: 0.72, scoop: 0.62 }
export const backFullness: Fullness = { cross: 0.55, lean: 0.7, out: 0.74, scoop: 0.5 }

/** The lean for a chord at an angle (radians): nothing for a level chord and for an upright one, so the head never leans over. */
export const leanUnit = (chord: number): number => Math.sin(2 * chord) / 2

/**
 * One half of a sleeve head, drawn to the right from the crown to the underarm: level at the crown, crossing its chord once,
 * square to the underarm seam at its end. It bends the other way exactly once, where it crosses the chord.
 *
 * @param crown top of the sleeve.
 * @param underarm end of the head, to the right of and below the crown.
 * @param arrives unit direction in which it reaches the underarm.
 * @param fullness the shape of this half; `lean` is what a solver changes to reach a length.
 */
export function headHalf(crown: Point, underarm: Point, arrives: Point, fullness: Fullness): Path {
  const dx = underarm.x - crown.x
  const dy = underarm.y - crown.y
  const chord = Math.atan2(dy, dx)
  const end = chord - Math.atan2(arrives.y, arrives.x)
  const lean = fullness.lean * leanUnit(chord)
  const at = { x: crown.x + dx * fullness.cross, y: crown.y + dy * fullness.cross }
  const through = { x: Math.cos(chord + lean), y: Math.sin(chord + lean) }
  const upper = Math.hypot(dx, dy) * fullness.cross
  const lower = Math.hypot(dx, dy) - upper
  const top = Math.sin(chord + lean)
  const bottom = Math.sin(end + lean)
  return openPath([
    cubic(
      crown,
      { x: crown.x + ((fullness.out * Math.sin(lean)) / top) * upper, y: crown.y },
      add(at, scale(through, ((-fullness.out * Math.sin(chord)) / top) * upper)),
      at,
    ),
    cubic(
      at,
      add(at, scale(through, ((fullness.scoop * Math.sin(end)) / bottom) * lower)),
      add(underarm, scale(arrives, ((-fullness.scoop * Math.sin(lean)) / bottom) * lower)),
      underarm,
    ),
  ])
}
