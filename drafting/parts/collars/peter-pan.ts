import type { DesignValue, Path, Point } from '../../contract'
import {
  add,
  cubic,
  endOf,
  endTangent,
  joinPaths,
  line,
  magnitude,
  offsetPath,
  openPath,
  pathLength,
  reversePath,
  rotate,
  scale,
  slicePath,
  startOf,
} from '../../geometry'
import { length } from '../../pen/design'
import type { Pen } from '../../pen/pen'
import { between } from '../../pen/piece-pen'
import { cutCollar, drawEnd, fallingEnds, sewLayers, type Collar, type Neck } from './collar'

const worn = { id: 'collar', is: ['Peter Pan'] }

export const peterPanDesign: readonly DesignValue[] = [
  length('collarWidth', 'Collar width', 'collar', { default: 65, min: 40, max: 90 }, worn),
  length('collarOverlap', 'Shoulders overlapped by', 'collar', { default: 20, min: 10, max: 45 }, worn),
]

/** Less than this of the bend from the shoulder to the centre back, and the collar would stand up instead of lying flat. Degrees. */
const leastBend = 25

/** Unit directions at the centre back of a back laid against the front: of the neck edge that arrives there, and outwards. */
interface LaidBack {
  readonly arrives: Point
  readonly outwards: Point
}

/**
 * A flat collar with round ends, drafted on the front and back necklines laid together at the shoulder with the shoulder tips
 * overlapped, so that its outer edge is a little short and the neck edge rolls over the seam. Common practice, from memory: tips
 * overlapped by 1.5–3 cm; more overlap gives more roll.
 */
export const peterPan: Collar = {
  draw(pen, neck) {
    const collar = pen.piece('collar', 'Collar')
    const names = ['collarOverlap']
    const laid = layBack(pen, neck)
    const neckEdge = joinPaths(neck.front.neckline, backOfCollar(neck, laid))
    const width = pen.length('collarWidth')
    const uses = neck.uses | pen.usesOf(names)
    collar.trace('centreNeck', neck.front.piece, neck.front.uses)
    collar.trace('sideNeck', neck.front.piece, neck.front.uses)
    collar.place('centreBack', endOf(neckEdge), {
      say: 'Lay the back on the front at the shoulder, the tips overlapped; from the side neck go round to the centre back until the neck edge measures the neckline',
      from: 'sideNeck',
      mask: uses,
      stepKind: 'solve',
    })
    const out = add(collar.at('centreBack'), scale(laid.outwards, width))
    collar.place('outerBack', out, {
      say: 'Down the centre back come the width of the collar',
      from: 'centreBack',
      mask: uses | pen.usesOf(['collarWidth']),
      drag: ['collarWidth'],
    })
    pen.tag({
      piece: 'collar',
      from: 'centreBack',
      to: 'outerBack',
      label: 'Collar width',
      value: 'collarWidth',
    })
    const ends = fallingEnds(neck.centres)
    collar.curve('neck', neckEdge, 'centreNeck', 'centreBack', {
      role: 'neckline',
      allowance: 'neckAllowance',
      say: 'Draw the neck edge: the front neckline, and on in one sweep to the centre back',
      mask: uses,
    })
    drawEnd(collar, 'centre-back', ends.back, 'centreBack', 'outerBack', 'collarAllowance')
    collar.curve('outer', outerEdge(neckEdge, width, out), 'outerBack', 'centreNeck', {
      role: 'free',
      finish: 'seam',
      allowance: 'collarAllowance',
      say: 'Draw the outer edge even with the neck edge, round at the front',
      uses: ['collarWidth'],
      mask: uses,
    })
    cutCollar(collar, ends)
    const beside = add(collar.at('centreBack'), scale(laid.arrives, -12))
    collar.grain(
      add(beside, scale(laid.outwards, width * 0.2)),
      add(beside, scale(laid.outwards, width * 0.8)),
    )
    sewLayers(pen, collar, ends.back === 'end' ? ['centre-back', 'outer'] : ['outer'])
    return { piece: collar, edge: 'neck', over: 0 }
  },
}

/** Lays the back against the front at the shoulder and overlaps the tips, as far as the collar still lies flat. */
function layBack(pen: Pen, { front, back }: Neck): LaidBack {
  const shoulder = between(front.piece.at('sideNeck'), front.piece.at('shoulderTip'))
  const behind = between(back.piece.at('sideNeck'), back.piece.at('shoulderTip'))
  const angle = (of: Point): number => (Math.atan2(of.y, of.x) * 180) / Math.PI
  const laid = angle(shoulder) - angle({ x: -behind.x, y: behind.y })
  const bend = angle(rotate(endTangent(front.neckline), -laid))
  const asked =
    (2 * Math.asin(Math.min(1, pen.length('collarOverlap') / 2 / magnitude(shoulder))) * 180) / Math.PI
  const most = Math.max(0, bend - leastBend)
  if (asked > most) {
    pen.caution(
      'collar-overlap-lessened',
      `On a shoulder of ${pen.say(magnitude(shoulder))} an overlap of ${pen.say(pen.length('collarOverlap'))} would make the collar stand up: it is drafted with less. Overlap less, or open the neck less wide.`,
      'collarOverlap',
      'neckWidening',
    )
  }
  const turn = laid + Math.min(asked, most)
  return { arrives: rotate({ x: 1, y: 0 }, turn), outwards: rotate({ x: 0, y: 1 }, turn) }
}

/** Share of the way from the shoulder to the centre back that the neck edge still follows the front, as a back neckline does. */
const onward = 0.32

/** The neck edge from the shoulder to the centre back: of the shape of a back neckline, as long as the garment's. */
function backOfCollar({ front, long }: Neck, { arrives }: LaidBack): Path {
  const side = endOf(front.neckline)
  const leaves = endTangent(front.neckline)
  const drawn = (size: number): Path => {
    const turn = add(side, scale(leaves, size * onward))
    const end = add(turn, scale(arrives, size * (1 - onward)))
    return openPath([
      cubic(
        side,
        add(side, scale(leaves, size * onward * 0.8)),
        add(end, scale(arrives, -size * (1 - onward) * 0.6)),
        end,
      ),
    ])
  }
  // A length grows in proportion to what it is drawn from.
  return drawn((100 * long.back) / pathLength(drawn(100)))
}

/** From the centre back even with the neck edge, round at the front and up the centre to the neckline. */
function outerEdge(neckEdge: Path, width: number, out: Point): Path {
  const even = reversePath(offsetPath(neckEdge, -width).path)
  const centre = startOf(neckEdge)
  const radius = width * 0.55
  const along = slicePath(even, 0, pathLength(even) - radius)
  const from = endOf(along)
  const heading = endTangent(along)
  const to = { x: centre.x, y: centre.y + width - radius }
  const [first, ...rest] = along.segments
  return joinPaths(
    openPath([{ ...first!, from: out }, ...rest]),
    openPath([
      cubic(from, add(from, scale(heading, radius * 0.6)), { x: to.x, y: to.y + radius * 0.5 }, to),
      line(to, centre),
    ]),
  )
}
