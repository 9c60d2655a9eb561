/**
 * Finds x in [low, high] where f(x) = 0 for a continuous f whose signs differ at the ends: Newton-like secant steps kept
 * inside a shrinking bracket, so that it ends for any such f.
 *
 * @returns x, or undefined when both ends have the same sign (nothing to find).
 */
export function solveBetween(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance = 1e-9,
): number | undefined {
  let a = low
  let b = high
  let fa = f(a)
  let fb = f(b)
  if (fa === 0) return a
  if (fb === 0) return b
  if (!(fa * fb < 0)) return undefined
  for (let round = 0; round < 80; round += 1) {
    // Illinois: regula falsi whose stale end is halved, so that neither end sticks.
    let x = (a * fb - b * fa) / (fb - fa)
    if (!(x > Math.min(a, b) && x < Math.max(a, b))) x = (a + b) / 2
    const fx = f(x)
    if (Math.abs(fx) <= tolerance || Math.abs(b - a) <= 1e-12) return x
    if (fx * fb < 0) {
      a = b
      fa = fb
    } else {
      fa /= 2
    }
    b = x
    fb = fx
  }
  return b
}
