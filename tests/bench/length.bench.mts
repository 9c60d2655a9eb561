import { Bezier } from 'bezier-js'
import type { CubicSegment } from '../../drafting/contract'
import { cubic, openPath, pathLength, pointAt, segmentLength } from '../../drafting/geometry'
import { chordLength, dense } from '../drafting/geometry/reference'
import { bench } from './support/bench'

const p = (x: number, y: number) => ({ x, y })
const curves: readonly [string, CubicSegment][] = [
  ['armhole', cubic(p(0, 0), p(-20, 60), p(-30, 150), p(70, 190))],
  ['near a cusp', cubic(p(0, 0), p(100, 100.5), p(0, 100), p(100, 0))],
]

/** From ever finer chords, whose error falls with the square of their number. */
const trueLength = (curve: CubicSegment): number => {
  const coarse = chordLength(dense(openPath([curve]), 0.01))
  const fine = chordLength(dense(openPath([curve]), 0.005))
  return fine + (fine - coarse) / 3
}

for (const [name, curve] of curves) {
  const length = trueLength(curve)
  const { from, control1, control2, to } = curve
  const peer = new Bezier(from, control1, control2, to)
  const miss = (measured: number) => `off by ${Math.abs(measured - length).toExponential(1)} mm`
  await bench(`arc length, ${name}, bezier-js`, () => peer.length(), { note: miss(peer.length()) })
  // A new curve each time, as a redraw makes them: nothing may be remembered.
  const fresh = () => segmentLength(cubic(from, control1, control2, to))
  await bench(`arc length, ${name}, ours`, fresh, {
    // At a cusp exactness is the aim, elsewhere speed too.
    ...(name === 'armhole' ? { aim: 0.0003 } : {}),
    against: `arc length, ${name}, bezier-js`,
    note: miss(segmentLength(curve)),
  })

  const path = openPath([curve])
  let turn = 0
  const next = () => {
    turn = (turn + 0.37) % 1
    return turn * length
  }
  /** The peer has no such call: halving with its own split and length is what its users write. */
  const halving = () => {
    const wanted = next()
    let low = 0
    let high = 1
    while (high - low > 1e-6) {
      const t = (low + high) / 2
      if (peer.split(0, t).length() < wanted) low = t
      else high = t
    }
    return peer.get(low)
  }
  await bench(`point at length, ${name}, bezier-js by halving`, halving)
  await bench(`point at length, ${name}, ours`, () => pointAt(path, next()), {
    ...(name === 'armhole' ? { aim: 0.00015 } : {}),
    against: `point at length, ${name}, bezier-js by halving`,
    note: `on a path of ${pathLength(path).toFixed(1)} mm that is asked again and again`,
  })
}
