import type { Point } from '@/drafting/contract'

/** A tag that wants to sit on a line of the sheet. All px on the screen. */
export interface TagWish {
  readonly id: string
  readonly from: Point
  readonly to: Point
  readonly width: number
  readonly height: number
}

export interface TagPlace {
  readonly id: string
  /** Top left corner. */
  readonly x: number
  readonly y: number
  /** No room for its words at this zoom: shown as a dot until it is pointed at. */
  readonly folded: boolean
}

export interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** Size of the dot a tag folds into: the least that a finger or pointer can take. */
export const foldedSize = 24

/** Where along its line a tag may sit, and on which side of it (0: on it), tried in this order. */
const seats = [
  [0.5, 0],
  [0.35, 0],
  [0.65, 0],
  [0.5, 1],
  [0.5, -1],
  [0.2, 0],
  [0.8, 0],
  [0.2, 1],
  [0.2, -1],
  [0.8, 1],
  [0.8, -1],
] as const

/** Ways out from the middle of a line that is too short for its tag. */
const aside = [
  [0, -1],
  [1, 0],
  [-1, 0],
  [0, 1],
  [1, -1],
  [-1, -1],
  [1, 1],
  [-1, 1],
] as const
const reaches = [10, 22, 34]
const gap = 2

/**
 * Sets every tag on its own line, or close beside it, without covering another. Earlier tags choose first, so give those that can be typed in
 * first. A tag that finds no room folds into a dot.
 * @param taken what must not be covered, such as points
 * @param frame the window: a tag whose line is in it stays in it
 */
export function placeTags(
  wishes: readonly TagWish[],
  taken: readonly Box[] = [],
  frame?: { readonly width: number; readonly height: number },
): readonly TagPlace[] {
  const full = [...taken]
  return wishes.map((wish) => {
    const middle = boxAt(wish, 0.5, 0, 0, 0)
    const held = frame && within(middle, frame) ? frame : undefined
    const free = (box: Box) => (!held || within(box, held)) && !full.some((other) => overlaps(box, other))
    const open = candidates(wish, wish.width, wish.height).find(free)
    const box =
      open ??
      candidates(wish, foldedSize, foldedSize).find(free) ??
      boxAt(wish, 0.5, 0, foldedSize, foldedSize)
    full.push(box)
    return { id: wish.id, x: box.x, y: box.y, folded: !open }
  })
}

/** Every box a tag of this size would take, the best first. */
function candidates(wish: TagWish, width: number, height: number): readonly Box[] {
  const own = seats.map(([share, side]) => boxAt(wish, share, side, width, height))
  const middle = boxAt(wish, 0.5, 0, width, height)
  const near = reaches.flatMap((reach) =>
    aside.map(([x, y]) => ({
      ...middle,
      x: middle.x + x * (width / 2 + reach),
      y: middle.y + y * (height / 2 + reach),
    })),
  )
  return [...own, ...near]
}

function boxAt(wish: TagWish, share: number, side: number, width: number, height: number): Box {
  const dx = wish.to.x - wish.from.x
  const dy = wish.to.y - wish.from.y
  const length = Math.hypot(dx, dy) || 1
  const normal = { x: dy / length, y: -dx / length }
  const off = side * (Math.abs(normal.x) * (width / 2) + Math.abs(normal.y) * (height / 2) + 4)
  return {
    x: wish.from.x + dx * share + normal.x * off - width / 2,
    y: wish.from.y + dy * share + normal.y * off - height / 2,
    width,
    height,
  }
}

function within(box: Box, frame: { readonly width: number; readonly height: number }): boolean {
  return box.x >= 0 && box.y >= 0 && box.x + box.width <= frame.width && box.y + box.height <= frame.height
}

function overlaps(a: Box, b: Box): boolean {
  return (
    a.x < b.x + b.width + gap &&
    b.x < a.x + a.width + gap &&
    a.y < b.y + b.height + gap &&
    b.y < a.y + a.height + gap
  )
}
