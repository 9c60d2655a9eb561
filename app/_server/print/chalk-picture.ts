import 'server-only'
import type { Piece } from '@/drafting/contract'
import type { ChalkSheet } from '@/drafting/chalk/guide'
import type { Style } from '@/drafting/drawing'
import { bounds } from '@/drafting/geometry/path'
import { applyTo, transformPath } from '@/drafting/geometry/transform'
import type { Transform } from '@/drafting/geometry/transform'
import { stitchLine } from '@/drafting/pieces/stitch-line'
import type { Block } from './blocks'
import type { PageContent } from './page-content'

const outline: Style = { stroke: 'madder', width: 0.5 }
const cut: Style = { stroke: 'ink', width: 0.25, dash: [2, 1.5] }
const tapeLine: Style = { stroke: 'indigo', width: 0.2, dash: [1, 1] }
const dot: Style = { stroke: 'ink', width: 0.5 }
const fold: Style = { stroke: 'indigo', width: 0.9, dash: [6, 1.5, 1, 1.5] }

/** mm that a picture may be high; and where a part is drawn larger below the whole, each of the two. */
const high = 110
const halfHigh = 72
/** Around it, for the letters, mm. */
const around = 8
/** A piece whose letters stand so near to each other at its top, mm on paper, is drawn a second time, larger. */
const crowded = 5

interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** The piece as it is chalked, small; and its upper part larger where the letters of the whole would lie on each other. */
export function piecePicture(piece: Piece, sheet: ChalkSheet, width: number): Block {
  const { min, max } = bounds(piece.cutLine)
  const whole = { x: min.x, y: min.y, width: max.x - min.x, height: max.y - min.y }
  const scale = scaleFor(whole, width, high)
  const spots = sheet.layings.flatMap(({ marks }) => marks.map(({ at }) => at))
  const nearest = Math.min(
    ...spots.flatMap((a, index) => spots.slice(index + 1).map((b) => Math.hypot(a.x - b.x, a.y - b.y))),
  )
  const alone = () => pictureOf(piece, sheet, whole, width, high)
  if (nearest * scale > crowded || whole.height < 1.6 * whole.width) return alone()
  const upper = spots.filter(({ y }) => y < min.y + whole.height * 0.35)
  if (upper.length < 4) return alone()
  const right = Math.max(...upper.map(({ x }) => x)) + 30
  const bottom = Math.max(...upper.map(({ y }) => y)) + 30
  const top = { x: min.x, y: min.y, width: right - min.x, height: bottom - min.y }
  return stacked(
    pictureOf(piece, sheet, whole, width, halfHigh),
    pictureOf(piece, sheet, top, width, halfHigh),
  )
}

/** Two pictures one below the other. */
function stacked(upper: Block, lower: Block): Block {
  return {
    height: upper.height + lower.height,
    draw: (content, at) => {
      upper.draw(content, at)
      lower.draw(content, { x: at.x, y: at.y + upper.height })
    },
  }
}

const scaleFor = (box: Box, width: number, height: number) =>
  Math.min((width - 2 * around) / box.width, (height - 2 * around) / box.height)

/** What lies in a box of the piece: stitching line, cutting line, the layings of the tape and the letters. */
function pictureOf(piece: Piece, sheet: ChalkSheet, box: Box, width: number, most: number): Block {
  const scale = scaleFor(box, width, most)
  const height = box.height * scale + 2 * around
  return {
    height: height + 3,
    draw: (content, at) => {
      const e = at.x + (width - box.width * scale) / 2 - box.x * scale
      const f = at.y + around - box.y * scale
      const map: Transform = { a: scale, b: 0, c: 0, d: scale, e, f }
      const window = { x: at.x, y: at.y, width, height }
      content.within(window, { x: at.x, y: at.y }, () => drawPiece(content, piece, sheet, map))
    },
  }
}

function drawPiece(content: PageContent, piece: Piece, sheet: ChalkSheet, map: Transform): void {
  content.path(transformPath(map, piece.cutLine), cut)
  content.path(transformPath(map, stitchLine(piece)), outline)
  for (const edge of piece.edges.filter(({ role }) => role === 'fold'))
    content.path(transformPath(map, edge.path), fold)
  for (const { tape, marks } of sheet.layings) {
    const last = marks.at(-1)
    if (tape && last) content.line(applyTo(map, tape.from), applyTo(map, last.at), tapeLine)
  }
  for (const { letter, at: spot } of sheet.layings.flatMap(({ marks }) => marks)) {
    const place = applyTo(map, spot)
    content.circle(place, 0.5, dot)
    content.text(letter, { x: place.x + 1.2, y: place.y - 1.2 }, { size: 4.2, weight: 600 })
  }
}
