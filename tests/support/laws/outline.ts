import type { Path, Piece, Point } from '@/drafting/contract'
import { chordsOf } from './curves'

/** The edges' own paths one behind the other; not closed by force. */
export function stitchPath(piece: Piece): Path {
  return { closed: true, segments: piece.edges.flatMap((edge) => edge.path.segments) }
}

/** Twice the signed area of a ring of points, mm²: positive when it runs clockwise on the sheet. */
export function ringArea(ring: readonly Point[]): number {
  let sum = 0
  for (let index = 0; index < ring.length; index += 1) {
    const a = ring[index] as Point
    const b = ring[(index + 1) % ring.length] as Point
    sum += a.x * b.y - b.x * a.y
  }
  return sum
}

/** The ring of a closed path without repeated points; its last point is not its first. */
export function ringOf(path: Path, tolerance = 0.02): Point[] {
  const ring: Point[] = []
  for (const point of chordsOf(path, tolerance)) {
    const before = ring[ring.length - 1]
    if (!before || Math.hypot(point.x - before.x, point.y - before.y) > 1e-7) ring.push(point)
  }
  const first = ring[0]
  const last = ring[ring.length - 1]
  if (first && last && ring.length > 1 && Math.hypot(first.x - last.x, first.y - last.y) <= 1e-7) ring.pop()
  return ring
}

interface Side {
  readonly index: number
  readonly a: Point
  readonly b: Point
  readonly low: number
  readonly high: number
}

/** The first place where a ring crosses, touches or runs back on itself; undefined when it is simple. */
export function crossingOf(ring: readonly Point[]): Point | undefined {
  const count = ring.length
  if (count < 3) return ring[0] ?? { x: NaN, y: NaN }
  const sides: Side[] = ring.map((a, index) => {
    const b = ring[(index + 1) % count] as Point
    return { index, a, b, low: Math.min(a.x, b.x), high: Math.max(a.x, b.x) }
  })
  for (let index = 0; index < count; index += 1) {
    const one = sides[index] as Side
    const next = sides[(index + 1) % count] as Side
    const cross = (one.b.x - one.a.x) * (next.b.y - next.a.y) - (one.b.y - one.a.y) * (next.b.x - next.a.x)
    const dot = (one.b.x - one.a.x) * (next.b.x - next.a.x) + (one.b.y - one.a.y) * (next.b.y - next.a.y)
    if (dot < 0 && Math.abs(cross) < 1e-6 * -dot) return one.b
  }
  // Swept from left to right: only sides whose widths overlap can meet.
  const order = [...sides].sort((p, q) => p.low - q.low)
  let open: Side[] = []
  for (const side of order) {
    open = open.filter((other) => other.high >= side.low)
    for (const other of open) {
      const apart = Math.abs(side.index - other.index)
      if (apart === 1 || apart === count - 1) continue
      const met = meeting(side, other)
      if (met) return met
    }
    open.push(side)
  }
  return undefined
}

function meeting(one: Side, other: Side): Point | undefined {
  const { a, b } = one
  const { a: c, b: d } = other
  if (Math.max(a.y, b.y) < Math.min(c.y, d.y) || Math.max(c.y, d.y) < Math.min(a.y, b.y)) return undefined
  const turn = (p: Point, q: Point, r: Point): number => (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x)
  const [abc, abd, cda, cdb] = [turn(a, b, c), turn(a, b, d), turn(c, d, a), turn(c, d, b)]
  if (abc * abd > 0 || cda * cdb > 0) return undefined
  if (abc === 0 && abd === 0) {
    // On one line: they meet only when their stretches overlap.
    const along = Math.abs(b.x - a.x) > Math.abs(b.y - a.y) ? 'x' : 'y'
    const low = Math.max(Math.min(a[along], b[along]), Math.min(c[along], d[along]))
    const high = Math.min(Math.max(a[along], b[along]), Math.max(c[along], d[along]))
    return low <= high ? a : undefined
  }
  const share = cda / (cda - cdb)
  return { x: a.x + (b.x - a.x) * share, y: a.y + (b.y - a.y) * share }
}

/** Whether a point lies inside a ring (crossings of a ray to the right). */
export function insideRing(ring: readonly Point[], point: Point): boolean {
  let inside = false
  for (let index = 0, before = ring.length - 1; index < ring.length; before = index, index += 1) {
    const a = ring[index] as Point
    const b = ring[before] as Point
    if (a.y > point.y !== b.y > point.y && point.x < ((b.x - a.x) * (point.y - a.y)) / (b.y - a.y) + a.x) {
      inside = !inside
    }
  }
  return inside
}

/** What is nearest on a chain of points. */
export interface Nearest {
  readonly gap: number
  readonly index: number
  /** 0…1 on the chord that begins at `index`. */
  readonly share: number
}

const strip = 16

/** A chain of chords that answers how near a point is; chords are boxed in groups, so that far groups are skipped. */
export class Chain {
  private readonly boxes: {
    readonly from: number
    readonly to: number
    readonly left: number
    readonly right: number
    readonly top: number
    readonly bottom: number
  }[] = []

  constructor(readonly points: readonly Point[]) {
    for (let from = 0; from < points.length - 1; from += strip) {
      const to = Math.min(points.length - 1, from + strip)
      const part = points.slice(from, to + 1)
      this.boxes.push({
        from,
        to,
        left: Math.min(...part.map((p) => p.x)),
        right: Math.max(...part.map((p) => p.x)),
        top: Math.min(...part.map((p) => p.y)),
        bottom: Math.max(...part.map((p) => p.y)),
      })
    }
  }

  /** Neighbours are asked one after another: the box that was nearest is looked into first. */
  private last = 0

  nearest(point: Point): Nearest {
    let best = { square: Infinity, index: 0, share: 0 }
    for (let turn = -1; turn < this.boxes.length; turn += 1) {
      if (turn === this.last) continue
      const box = this.boxes[turn < 0 ? this.last : turn]
      if (!box) continue
      const dx = Math.max(box.left - point.x, 0, point.x - box.right)
      const dy = Math.max(box.top - point.y, 0, point.y - box.bottom)
      if (dx * dx + dy * dy > best.square) continue
      for (let index = box.from; index < box.to; index += 1) {
        const a = this.points[index] as Point
        const b = this.points[index + 1] as Point
        const x = b.x - a.x
        const y = b.y - a.y
        const long = x * x + y * y
        const share =
          long > 0 ? Math.min(1, Math.max(0, ((point.x - a.x) * x + (point.y - a.y) * y) / long)) : 0
        const square = (a.x + x * share - point.x) ** 2 + (a.y + y * share - point.y) ** 2
        if (square < best.square) best = { square, index, share }
      }
    }
    this.last = Math.floor(best.index / strip)
    return { gap: Math.sqrt(best.square), index: best.index, share: best.share }
  }

  gap(point: Point): number {
    return this.nearest(point).gap
  }
}

/** A ring as a chain that closes. */
export function closedChain(ring: readonly Point[]): Chain {
  return new Chain(ring.length > 0 ? [...ring, ring[0] as Point] : ring)
}
