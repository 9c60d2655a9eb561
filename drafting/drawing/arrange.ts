import type { Draft, Piece } from '../contract'
import { bounds } from '../geometry/path'
import type { Place, Places } from './options'
import { placePath } from './place'
import { outline } from './outline'

export interface ArrangeOptions {
  /** Where pieces lie now: a piece keeps its place unless it has grown into another. */
  readonly kept?: Places
  /** Between pieces, mm. Default 30. */
  readonly gap?: number
  /** Make room for the allowances. Default true. */
  readonly allowances?: boolean
  /** How far down the sheet pieces may reach, mm. Default: the tallest piece. */
  readonly height?: number
}

interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** Places and room taken are multiples of this, mm, so that nothing trembles while a point is dragged. */
const grid = 20

/** As they lie on a table: body, then skirt, sleeves, bands, facings, pockets. */
const order = [
  /^front/,
  /^back/,
  /body|bodice|skirt|panel/,
  /sleeve|cuff/,
  /band|collar|tie/,
  /facing/,
  /pocket/,
]

function rank(piece: Piece): number {
  if (/facing/.test(piece.id)) return 5
  const found = order.findIndex((pattern) => pattern.test(piece.id))
  return found < 0 ? 4.5 : found
}

/**
 * Lays the pieces of a draft side by side without overlap: front and back next to each other with their levels in line, the
 * smaller ones below and beside them. Depends on ids and sizes alone, in steps of 20 mm.
 */
export function arrange(draft: Draft, options: ArrangeOptions = {}): Places {
  const gap = options.gap ?? 30
  const sized = draft.pieces.map((piece) => ({
    piece,
    box: pieceBox(piece, gap, options.allowances ?? true),
  }))
  const sheet = options.height ?? Math.max(0, ...sized.map(({ box }) => box.height))
  const placed: Box[] = []
  const places: Record<string, Place> = {}
  const lay = (piece: Piece, place: Place, room: Box) => {
    places[piece.id] = place
    placed.push(room)
  }
  for (const { piece, box } of sized) {
    const kept = options.kept?.[piece.id]
    if (!kept) continue
    const room = kept.turn
      ? pieceBox(piece, gap, options.allowances ?? true, kept)
      : { ...box, x: box.x + kept.x, y: box.y + kept.y }
    if (!placed.some((other) => overlap(other, room))) lay(piece, kept, room)
  }
  const waiting = sized.filter(({ piece }) => !places[piece.id])
  waiting.sort((a, b) => rank(a.piece) - rank(b.piece))
  for (const { piece, box } of waiting) {
    const room = freeRoom(placed, box, sheet)
    lay(piece, { x: room.x - box.x, y: room.y - box.y }, room)
  }
  return places
}

/** The room a piece takes in its own frame (or at its place), outward to the grid. */
function pieceBox(piece: Piece, gap: number, allowances: boolean, place?: Place): Box {
  const path = outline(piece, allowances)
  const { min, max } = bounds(place ? placePath(path, place) : path)
  const x = down(min.x)
  const y = down(min.y)
  return { x, y, width: up(max.x + gap) - x, height: up(max.y + gap) - y }
}

const down = (value: number) => Math.floor(value / grid) * grid
const up = (value: number) => Math.ceil(value / grid) * grid

/** The free place furthest left, then furthest up, that does not reach below the sheet. */
function freeRoom(placed: readonly Box[], box: Box, sheet: number): Box {
  const xs = [0, ...placed.map((other) => other.x + other.width)].sort((a, b) => a - b)
  const ys = [0, ...placed.map((other) => other.y + other.height)].sort((a, b) => a - b)
  const floor = Math.max(sheet, box.height)
  for (const x of xs) {
    for (const y of ys) {
      const room = { ...box, x, y }
      if (y + box.height <= floor && !placed.some((other) => overlap(other, room))) return room
    }
  }
  return { ...box, x: xs.at(-1) ?? 0, y: 0 }
}

function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height
}
