import type { Path, Piece, Point } from '@/drafting/contract'
import { closedChain, crossingOf, insideRing, ringArea, ringOf, stitchPath } from './outline'
import { Findings, type DraftLaw } from './violation'

/** Every stitch and cut line is finite, closed, clockwise and simple; the cut line contains the stitch line. */
export const outlines: DraftLaw = (draft) => {
  const found = new Findings(1)
  for (const piece of draft.pieces) {
    const stitch = stitchPath(piece)
    const sound = ring(found, `${piece.id} stitch line`, stitch)
    const cutSound = ring(found, `${piece.id} cut line`, piece.cutLine)
    cutsInOrder(found, piece)
    if (sound && cutSound) containment(found, piece.id, ringOf(stitch), ringOf(piece.cutLine))
    inside(found, piece)
  }
  return found.all
}

function ring(found: Findings, where: string, path: Path): boolean {
  const { segments } = path
  if (segments.length === 0) {
    found.add(where, 'has no segments')
    return false
  }
  if (!path.closed) found.add(where, 'is not marked as closed')
  for (const [index, segment] of segments.entries()) {
    const next = segments[(index + 1) % segments.length] as (typeof segments)[number]
    const points =
      segment.kind === 'line'
        ? [segment.from, segment.to]
        : [segment.from, segment.control1, segment.control2, segment.to]
    if (
      !points.every(
        ({ x, y }) => Number.isFinite(x) && Number.isFinite(y) && Math.abs(x) < 1e5 && Math.abs(y) < 1e5,
      )
    ) {
      found.add(where, `is not finite at segment ${index}`)
      return false
    }
    if (segment.to.x !== next.from.x || segment.to.y !== next.from.y) {
      found.add(where, `is open behind segment ${index}`)
      return false
    }
  }
  const points = ringOf(path)
  if (!(ringArea(points) > 0)) found.add(where, 'does not run clockwise')
  const crossing = crossingOf(points)
  if (crossing) {
    found.add(where, `crosses or touches itself at ${crossing.x.toFixed(2)}, ${crossing.y.toFixed(2)}`)
    return false
  }
  return true
}

/** The cut line is the edges' own cuts in order; an edge swallowed by its neighbours gives one point to it. */
function cutsInOrder(found: Findings, piece: Piece): void {
  const own = piece.edges
    .flatMap((edge) => edge.cut.segments)
    .filter((one) => one.kind === 'cubic' || one.from.x !== one.to.x || one.from.y !== one.to.y)
  const same =
    own.length === piece.cutLine.segments.length &&
    own.every((one, index) => JSON.stringify(one) === JSON.stringify(piece.cutLine.segments[index]))
  if (!same) found.add(`${piece.id} cut line`, 'is not its edges’ cuts in order')
}

function containment(found: Findings, piece: string, stitch: readonly Point[], cut: readonly Point[]): void {
  const chain = closedChain(cut)
  for (const point of stitch) {
    if (insideRing(cut, point) || chain.gap(point) <= 0.03) continue
    found.add(
      `${piece} cut line`,
      `leaves out the stitch line at ${point.x.toFixed(2)}, ${point.y.toFixed(2)}`,
    )
    return
  }
}

/** The grain line lies on the piece, and every other number is finite. */
function inside(found: Findings, piece: Piece): void {
  const outline = ringOf(piece.cutLine)
  for (const end of [piece.grain.from, piece.grain.to]) {
    if (!insideRing(outline, end)) found.add(`${piece.id} grain`, 'leaves the piece')
  }
  const points = [...piece.marks.map((mark) => mark.at), ...piece.notches.map(({ at }) => ({ x: at, y: 0 }))]
  if (!points.every(({ x, y }) => Number.isFinite(x) && Number.isFinite(y)))
    found.add(piece.id, 'has a mark that is not finite')
}
