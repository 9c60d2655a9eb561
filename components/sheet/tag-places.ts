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

interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** Size of the dot a tag folds into: the least that a finger or pointer can take. */
export const foldedSize = 24

/** Where along its line a tag may sit, tried in this order. */
const shares = [0.5, 0.35, 0.65, 0.2, 0.8]
const gap = 2

/**
 * Sets every tag on its own line without covering another. Earlier tags choose first, so give those that can be typed in first. A tag that
 * finds no room on its line folds into a dot.
 */
export function placeTags(wishes: readonly TagWish[]): readonly TagPlace[] {
  const taken: Box[] = []
  return wishes.map((wish) => {
    const open = shares
      .map((share) => boxAt(wish, share, wish.width, wish.height))
      .find((box) => !taken.some((other) => overlaps(box, other)))
    const box = open ?? boxAt(wish, 0.5, foldedSize, foldedSize)
    taken.push(box)
    return { id: wish.id, x: box.x, y: box.y, folded: !open }
  })
}

function boxAt(wish: TagWish, share: number, width: number, height: number): Box {
  return {
    x: wish.from.x + (wish.to.x - wish.from.x) * share - width / 2,
    y: wish.from.y + (wish.to.y - wish.from.y) * share - height / 2,
    width,
    height,
  }
}

function overlaps(a: Box, b: Box): boolean {
  return (
    a.x < b.x + b.width + gap &&
    b.x < a.x + a.width + gap &&
    a.y < b.y + b.height + gap &&
    b.y < a.y + a.height + gap
  )
}
