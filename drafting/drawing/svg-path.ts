import type { Path } from '../contract'

/** Three decimals of a millimetre: finer than any plotter, shorter than a float. */
export const svgNumber = (value: number): string => String(Math.round(value * 1000) / 1000 || 0)

/** The `d` of an SVG path, in mm. */
export function svgPath(path: Path): string {
  const first = path.segments[0]
  if (!first) return ''
  const pair = (point: { x: number; y: number }) => `${svgNumber(point.x)} ${svgNumber(point.y)}`
  const drawn = path.segments.map((segment) =>
    segment.kind === 'line'
      ? `L${pair(segment.to)}`
      : `C${pair(segment.control1)} ${pair(segment.control2)} ${pair(segment.to)}`,
  )
  return `M${pair(first.from)}${drawn.join('')}${path.closed ? 'Z' : ''}`
}
