import type { PagePicture } from './rendered'

/** mm from the top left corner of the page. */
export interface Spot {
  readonly x: number
  readonly y: number
}

const inked = 70
const ringRadius = 3
const ringSamples = 48

function darkAround(picture: PagePicture, x: number, y: number): boolean {
  for (let dy = -1; dy <= 1; dy += 1) {
    for (let dx = -1; dx <= 1; dx += 1) {
      if ((picture.dark[(Math.round(y) + dy) * picture.width + Math.round(x) + dx] ?? 0) > inked) return true
    }
  }
  return false
}

/** How much of a circle of 3 mm about a dot is inked, 0…1. */
function ringShare(picture: PagePicture, x: number, y: number, radius = ringRadius): number {
  let found = 0
  for (let index = 0; index < ringSamples; index += 1) {
    const angle = (index / ringSamples) * 2 * Math.PI
    const r = radius * picture.perMm
    if (darkAround(picture, x + r * Math.cos(angle), y + r * Math.sin(angle))) found += 1
  }
  return found / ringSamples
}

/** Whether arms of a cross run from a dot to 4 mm on all four sides. */
function hasCross(picture: PagePicture, x: number, y: number): boolean {
  for (let step = 0.5; step <= 4; step += 0.25) {
    const r = step * picture.perMm
    if (!darkAround(picture, x + r, y) || !darkAround(picture, x - r, y)) return false
    if (!darkAround(picture, x, y + r) || !darkAround(picture, x, y - r)) return false
  }
  return true
}

/**
 * The match marks in a picture: circles of 3 mm with a cross through them, wherever they are. Each place is the crossing of the
 * middles of its arms.
 */
export function findMarks(picture: PagePicture): readonly Spot[] {
  const reach = Math.ceil(5 * picture.perMm)
  const found: { x: number; y: number; share: number }[] = []
  for (let y = reach; y < picture.height - reach; y += 1) {
    for (let x = reach; x < picture.width - reach; x += 1) {
      if ((picture.dark[y * picture.width + x] ?? 0) <= inked) continue
      if (!hasCross(picture, x, y)) continue
      const share = ringShare(picture, x, y)
      // A mark is a ring and nothing but a cross within it.
      if (share < 0.95 || ringShare(picture, x, y, 2) > 0.5) continue
      const near = found.find((other) => Math.hypot(other.x - x, other.y - y) < picture.perMm)
      if (!near) found.push({ x, y, share })
      else if (share > near.share) Object.assign(near, { x, y, share })
    }
  }
  return found.map(({ x, y }) => ({ x: armMiddle(picture, x, y, false), y: armMiddle(picture, x, y, true) }))
}

/**
 * The middle of a level (or upright) arm's thickness, mm: the median of what is read at many places between circle and centre,
 * so that a line of the pattern that runs across the mark does not pull it.
 */
function armMiddle(picture: PagePicture, x: number, y: number, level: boolean): number {
  const middles: number[] = []
  for (let step = 0.6; step <= 2.5; step += 0.08) {
    for (const side of [-1, 1]) {
      const along = Math.round((level ? x : y) + side * step * picture.perMm)
      const middle = level ? y : x
      let weight = 0
      let sum = 0
      for (let across = middle - 4; across <= middle + 4; across += 1) {
        const dark =
          picture.dark[level ? across * picture.width + along : along * picture.width + across] ?? 0
        weight += dark
        sum += dark * (across + 0.5)
      }
      if (weight > 0) middles.push(sum / weight)
    }
  }
  middles.sort((a, b) => a - b)
  return (middles[Math.floor(middles.length / 2)] ?? NaN) / picture.perMm
}
