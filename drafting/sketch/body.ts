import type { Edge, Path, Piece, Point } from '../contract'
import { bounds, transformPath, translation } from '../geometry'
import { wornOutline } from './outline'
import type { SketchLine } from './sketch-line'

/** The front pieces one below the other: a skirt's waist hangs from the waist of what is above it. */
export function bodySketch(fronts: readonly Piece[]): readonly SketchLine[] {
  const skirts = fronts.filter(isSkirt)
  const tops = fronts.filter((piece) => !isSkirt(piece))
  const waist = tops.length > 0 ? Math.max(...tops.map((piece) => centreOf(piece).max.y)) : undefined
  return [
    ...skirts.flatMap((piece) => {
      const drop = waist === undefined ? 0 : waist - centreOf(piece).min.y
      return gathered(piece, wornOutline(piece)).map((line) => moved(line, translation(0, drop)))
    }),
    ...tops.flatMap(wornOutline),
  ]
}

/** A piece that begins at the waist: nothing of it lies at the neck or the arm. */
export function isSkirt({ edges }: Piece): boolean {
  return (
    edges.some(({ role }) => role === 'waist') &&
    !edges.some(({ role }) => role === 'neckline' || role === 'armhole')
  )
}

/** From where to where a piece reaches along its centre. */
function centreOf({ edges }: Piece): { readonly min: Point; readonly max: Point } {
  const centre = edges.find(({ id, role }) => role === 'fold' || id.includes('centre')) ?? edges[0]
  return bounds((centre as Edge).path)
}

const moved = (line: SketchLine, by: Parameters<typeof transformPath>[0]): SketchLine => ({
  ...line,
  path: transformPath(by, line.path),
})

/** A skirt that is gathered at the waist hangs from less than its width. */
export const gatheredTo = 0.45

export const isGathered = ({ lines }: Piece): boolean => lines.some(({ kind }) => kind === 'gather')

function gathered(piece: Piece, lines: readonly SketchLine[]): readonly SketchLine[] {
  if (!isGathered(piece)) return lines
  const { min, max } = bounds(piece.cutLine)
  const drawn = (at: Point): Point => {
    const down = Math.min(1, Math.max(0, (at.y - min.y) / (max.y - min.y)))
    return { x: at.x * (gatheredTo + (1 - gatheredTo) * Math.sqrt(down)), y: at.y }
  }
  const folds = [-0.75, -0.45, -0.15, 0.15, 0.45, 0.75].map((share): SketchLine => {
    const [from, to] = [0, 0.3].map((down) =>
      drawn({ x: share * max.x, y: min.y + down * (max.y - min.y) }),
    ) as [Point, Point]
    return { kind: 'inner', path: { closed: false, segments: [{ kind: 'line', from, to }] } }
  })
  return [...lines.map((line) => ({ ...line, path: warped(line.path, drawn) })), ...folds]
}

function warped(path: Path, to: (at: Point) => Point): Path {
  const segments = path.segments.map((segment) =>
    segment.kind === 'line'
      ? {
          ...segment,
          kind: 'cubic' as const,
          from: to(segment.from),
          control1: to(between(segment.from, segment.to, 1 / 3)),
          control2: to(between(segment.from, segment.to, 2 / 3)),
          to: to(segment.to),
        }
      : {
          ...segment,
          from: to(segment.from),
          control1: to(segment.control1),
          control2: to(segment.control2),
          to: to(segment.to),
        },
  )
  return { ...path, segments }
}

const between = (a: Point, b: Point, share: number): Point => ({
  x: a.x + (b.x - a.x) * share,
  y: a.y + (b.y - a.y) * share,
})
