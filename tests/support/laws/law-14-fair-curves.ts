import type { Edge, Path } from '@/drafting/contract'
import {
  endOfPath,
  far,
  headingAtEnd,
  headingAtStart,
  lengthOfPath,
  placeOn,
  startOfPath,
  turnFrom,
} from './curves'
import { garmentOf, neckShape, styleOf } from './formulas'
import { Findings, type DraftLaw } from './violation'

/** A bend under this many degrees in all is no bend that an eye or an iron would notice. */
const unseen = 0.5

/** Nobody can sew a line round a tighter bend than this, mm: a curve that has one has a spike. */
const sewable = 5

/** Curves bend as their kind may: necks and hems one way, an armhole at most twice, half a sleeve head exactly twice. */
export const fairCurves: DraftLaw = (draft, order, engine) => {
  const found = new Findings(14)
  const garment = garmentOf(order, engine.garments)
  const square = ['square', 'sweetheart'].includes(String(neckShape(order, garment)))
  const cap =
    garment.design.some((value) => value.id === 'sleeve') && styleOf(order, garment, 'sleeve') === 'cap'
  for (const piece of draft.pieces) {
    for (const edge of piece.edges) {
      const where = `${piece.id}.${edge.id}`
      // A square or a sweetheart neck has its corner, and the facing that runs round it too.
      const cornered =
        square && piece.id.startsWith('front') && (edge.role === 'neckline' || edge.role === 'free')
      handles(found, where, edge.path)
      if (!cornered) joints(found, where, edge.path)
      const bends = inflections(edge.path)
      const head = piece.id === 'sleeve' && edge.id.startsWith('head-')
      if (head && cap) {
        // A cap ends before or behind the place where the whole head bends back.
        found.atMost(where, 'bends the other way so many times', bends, 1)
      } else if (head) {
        if (bends !== 1) found.add(where, `bends the other way ${bends} times, once is due`)
      } else if (edge.role === 'armhole') {
        found.atMost(where, 'bends the other way so many times', bends, 1)
      } else if (edge.role === 'neckline' || edge.role === 'hem' || edge.role === 'waist') {
        found.atMost(where, 'bends the other way so many times', bends, 0)
      }
      if (shaped(edge) && !cornered) spikes(found, where, edge.path)
    }
  }
  return found.all
}

const shaped = (edge: Edge): boolean => ['neckline', 'armhole', 'hem', 'waist'].includes(edge.role)

/** No handle of a curve is longer than the curve's edge. */
function handles(found: Findings, where: string, path: Path): void {
  const whole = lengthOfPath(path)
  for (const segment of path.segments) {
    if (segment.kind === 'line') continue
    const longest = Math.max(far(segment.from, segment.control1), far(segment.control2, segment.to))
    found.atMost(where, 'handle longer than its edge', longest, whole)
  }
}

/** Within an edge one segment runs into the next without a kink. */
function joints(found: Findings, where: string, path: Path): void {
  path.segments.forEach((segment, index) => {
    const next = path.segments[index + 1]
    if (!next) return
    const turn = turnFrom(
      headingAtEnd({ closed: false, segments: [segment] }),
      headingAtStart({ closed: false, segments: [next] }),
    )
    found.atMost(where, `kink between segments ${index} and ${index + 1}, degrees`, Math.abs(turn), 0.5)
  })
}

interface Bend {
  /** 1/mm, positive to the right. */
  readonly curvature: number
  readonly turn: number
}

function bendsOf(path: Path, each = 64): Bend[] {
  return path.segments.flatMap((segment) => {
    if (segment.kind === 'line') return []
    const bends: Bend[] = []
    for (let step = 0; step < each; step += 1) {
      const { slope, bend } = placeOn(segment, (step + 0.5) / each)
      const speed = Math.hypot(slope.x, slope.y)
      if (speed < 1e-9) continue
      const curvature = (slope.x * bend.y - slope.y * bend.x) / speed ** 3
      bends.push({ curvature, turn: (curvature * speed * 180) / Math.PI / each })
    }
    return bends
  })
}

/** How often a path changes from bending one way to the other. */
export function inflections(path: Path): number {
  let changes = 0
  let way = 0
  let turned = 0
  let pending = 0
  for (const { turn } of bendsOf(path)) {
    if (Math.sign(turn) !== Math.sign(pending)) pending = 0
    pending += turn
    if (Math.abs(pending) < unseen) continue
    const now = Math.sign(pending)
    if (way !== 0 && now !== way) changes += 1
    way = now
    turned += turn
  }
  return Number.isFinite(turned) ? changes : NaN
}

/** Nowhere does a drawn curve turn in a few millimetres what its neighbourhood does not ask for. */
function spikes(found: Findings, where: string, path: Path): void {
  const chord = far(startOfPath(path), endOfPath(path))
  const tightest = Math.max(0, ...bendsOf(path).map((bend) => Math.abs(bend.curvature)))
  if (tightest > 0 && 1 / tightest < Math.min(sewable, chord / 8)) {
    found.add(where, `has a bend of only ${(1 / tightest).toFixed(1)} mm radius`)
  }
}
