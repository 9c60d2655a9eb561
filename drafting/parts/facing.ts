import type { Path, Point } from '../contract'
import {
  add,
  distance,
  endOf,
  intersections,
  line,
  offsetPath,
  openPath,
  reversePath,
  scale,
  startOf,
  startTangent,
  unit,
  cross,
  endTangent,
} from '../geometry'
import type { Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import { between, straight, type PiecePen } from '../pen/piece-pen'
import { fairCurve } from './hem'
import { armholeCurve } from './armhole'
import { leaning, neckCurve } from './necklines'
import { mostCurvedLean } from './necklines/neckline'
import { v } from './necklines/v'
import { trimBetween } from './trim'

const down = { x: 0, y: 1 }

/**
 * The outer edge of a band of even depth beside a neckline, from the centre to the shoulder. It meets the shoulder at
 * exactly the same distance in front and back. Where the neckline bends too sharply for an even band, the outer
 * edge is a plain neck curve of its own, pointed where the neckline is.
 */
function evenBand(neckline: Path, depth: number, body: PiecePen, shoulder: Point): Path {
  const centre = body.at('centreNeck')
  const side = body.at('sideNeck')
  // A neckline that is not square to the shoulder crosses it slanting; front and back do so alike, so they still meet.
  const along = depth / Math.abs(cross(shoulder, endTangent(neckline)))
  const end = { x: side.x + shoulder.x * along, y: side.y + shoulder.y * along }
  const beside = offsetPath(neckline, -depth)
  const even = beside.clipped
    ? undefined
    : trimBetween(beside.path, { at: centre, along: down }, { at: side, along: shoulder })
  const last = even?.segments.at(-1)
  if (even && last && distance(last.to, end) < 0.3) {
    return { closed: false, segments: [...even.segments.slice(0, -1), { ...last, to: end }] }
  }
  const low = { x: centre.x, y: Math.max(centre.y, end.y) + depth }
  // It leaves the shoulder as the neckline does, so that front and back still run on into each other.
  const arrives = endTangent(neckline)
  const pointed = Math.abs(startTangent(neckline).y) > 0.2
  const corner = neckline.segments.length > 1 ? neckline.segments.at(-1)?.from : undefined
  if (pointed && corner) {
    const knee = add(end, scale(arrives, -Math.max(10, corner.y + depth * 0.4 - end.y)))
    return openPath([line(low, knee), line(knee, end)])
  }
  if (pointed) return v.draw(low, end, { x: -arrives.x, y: -arrives.y })
  const lean = Math.min(
    (Math.atan2(arrives.x, -arrives.y) * 180) / Math.PI,
    mostCurvedLean(end.x - low.x, low.y - end.y),
  )
  return neckCurve(low, end, leaning(lean), 0.52, 0.5)
}

/** What a facing is traced from: a body with its darts closed. */
export interface Faced {
  readonly piece: PiecePen
  readonly neckline: Path
  readonly armhole: Path
  /** Unit direction of the side seam at the underarm, downwards. */
  readonly side: Point
  readonly uses: Mask
}

/** A body without darts, as it lies. */
export function facedBody(piece: PiecePen): Faced {
  const neckline = piece.edge('neckline')
  const armhole = piece.edge('armhole')
  return {
    piece,
    neckline: neckline.path,
    armhole: armhole.path,
    side: startTangent(piece.edge('side').path),
    uses: neckline.uses | armhole.uses,
  }
}

/** Facings are cut once in the cloth and once in interfacing. */
function cutFacing(facing: PiecePen, onFold: boolean): void {
  const count = onFold ? 1 : 2
  facing.cut(
    { cloth: 'main', count, onFold, handed: !onFold },
    { cloth: 'interfacing', count, onFold, handed: !onFold },
  )
}

/**
 * The facing of one half of a neckline: a band of even depth measured from the stitched neckline, from the centre to the
 * shoulder. Its neckline is the garment's own, so it lies on it exactly.
 *
 * @param depth mm.
 * @param onFold whether the centre lies on the fold; otherwise it is turned in beside the zip.
 */
export function neckFacing(pen: Pen, faced: Faced, depth: number, onFold: boolean): PiecePen {
  const body = faced.piece
  const facing = pen.piece(`${body.id}-neck-facing`, `${body.name} neck facing`)
  const shoulder = unit(between(body.at('sideNeck'), body.at('shoulderTip')))
  const inside = evenBand(faced.neckline, depth, body, shoulder)
  const names = ['facingDepth']
  const through = ['centreNeck', 'sideNeck', 'shoulderTip']
  copyMarks(facing, body, ['centreNeck', 'sideNeck'], faced.uses)
  facing.aid('shoulderTip', body)
  facing.place('shoulderEdge', endOf(inside), {
    say: 'Along the shoulder come out the depth of the facing',
    from: 'sideNeck',
    uses: names,
    through: ['sideNeck', 'shoulderTip'],
  })
  facing.place('centreEdge', startOf(inside), {
    say: 'Down the centre come the depth of the facing',
    from: 'centreNeck',
    uses: names,
    through,
  })
  facing.curve('neckline', faced.neckline, 'centreNeck', 'sideNeck', {
    role: 'neckline',
    allowance: 'neckAllowance',
    kind: 'copy',
    say: `Trace the neckline from the ${body.name.toLowerCase()}`,
    through,
  })
  facing.line('shoulder', 'sideNeck', 'shoulderEdge', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Trace the shoulder as far as the facing goes',
  })
  facing.curve('outer', reversePath(inside), 'shoulderEdge', 'centreEdge', {
    role: 'free',
    say: 'Draw the outer edge even with the neckline',
    uses: names,
    through,
  })
  centreEdge(facing, onFold, 'centreEdge')
  finishFacing(facing, onFold)
  return facing
}

/**
 * The facing of one half of an armhole: a band of even depth from the shoulder to the side seam.
 *
 * @param depth mm.
 */
export function armholeFacing(pen: Pen, faced: Faced, depth: number): PiecePen {
  const body = faced.piece
  const facing = pen.piece(`${body.id}-armhole-facing`, `${body.name} armhole facing`)
  const shoulder = unit(between(body.at('sideNeck'), body.at('shoulderTip')))
  const { side } = faced
  const tip = body.at('shoulderTip')
  const hollow = body.at('hollow')
  const underarm = body.at('underarm')
  const inside = armholeCurve(
    { x: tip.x - shoulder.x * depth, y: tip.y - shoulder.y * depth },
    { x: hollow.x - depth, y: hollow.y },
    { x: underarm.x + side.x * depth, y: underarm.y + side.y * depth },
    shoulder,
    side,
  )
  const names = ['facingDepth']
  const through = ['sideNeck', 'shoulderTip', 'hollow', 'underarm']
  copyMarks(facing, body, ['shoulderTip', 'hollow', 'underarm'], faced.uses)
  facing.aid('sideNeck', body)
  facing.place('shoulderEdge', startOf(inside), {
    say: 'Along the shoulder come in the depth of the facing',
    from: 'shoulderTip',
    uses: names,
    through,
  })
  facing.place('sideEdge', endOf(inside), {
    say: 'Down the side seam come the depth of the facing',
    from: 'underarm',
    uses: names,
    through,
  })
  facing.line('shoulder', 'shoulderEdge', 'shoulderTip', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Trace the end of the shoulder',
  })
  facing.curve('armhole', faced.armhole, 'shoulderTip', 'underarm', {
    role: 'armhole',
    allowance: 'armholeAllowance',
    kind: 'copy',
    say: `Trace the armhole from the ${body.name.toLowerCase()}`,
    through,
  })
  facing.line('side', 'underarm', 'sideEdge', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Trace the top of the side seam',
  })
  facing.curve('outer', reversePath(inside), 'sideEdge', 'shoulderEdge', {
    role: 'free',
    say: 'Draw the outer edge even with the armhole',
    uses: names,
    through,
  })
  facing.cut(
    { cloth: 'main', count: 2, onFold: false, handed: true },
    { cloth: 'interfacing', count: 2, onFold: false, handed: true },
  )
  const middle = facing.at('hollow').x - depth / 2
  const level = facing.at('hollow').y
  facing.grain({ x: middle, y: level - depth * 0.6 }, { x: middle, y: level + depth * 0.6 })
  return facing
}

/**
 * One facing for neck and armhole together, where the shoulder is too narrow for two: it covers the whole shoulder and ends
 * below the armhole.
 *
 * @param depth how far below the underarm and the neckline it ends, mm.
 */
export function shoulderFacing(pen: Pen, faced: Faced, depth: number, onFold: boolean): PiecePen {
  const body = faced.piece
  const facing = pen.piece(`${body.id}-neck-facing`, `${body.name} facing, neck and armhole`)
  const through = ['centreNeck', 'sideNeck', 'shoulderTip', 'hollow', 'underarm']
  const { side } = faced
  copyMarks(facing, body, through, faced.uses)
  const underarm = body.at('underarm')
  const sideEdge = { x: underarm.x + side.x * depth, y: underarm.y + side.y * depth }
  const lowest = Math.max(body.at('centreNeck').y + depth, underarm.y + depth + 5)
  const names = ['facingDepth']
  facing.place('sideEdge', sideEdge, {
    say: 'Down the side seam come the depth of the facing',
    from: 'underarm',
    uses: names,
    through: ['underarm'],
  })
  facing.place(
    'centreEdge',
    { x: 0, y: lowest },
    {
      say: 'Down the centre come below both the neckline and the armhole',
      from: 'centreNeck',
      uses: names,
      through: ['underarm', 'centreNeck'],
    },
  )
  facing.curve('neckline', faced.neckline, 'centreNeck', 'sideNeck', {
    role: 'neckline',
    allowance: 'neckAllowance',
    kind: 'copy',
    say: `Trace the neckline from the ${body.name.toLowerCase()}`,
  })
  facing.line('shoulder', 'sideNeck', 'shoulderTip', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Trace the shoulder',
  })
  facing.curve('armhole', faced.armhole, 'shoulderTip', 'underarm', {
    role: 'armhole',
    allowance: 'armholeAllowance',
    kind: 'copy',
    say: `Trace the armhole from the ${body.name.toLowerCase()}`,
  })
  facing.line('side', 'underarm', 'sideEdge', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Trace the top of the side seam',
  })
  facing.curve('outer', lowerEdge(sideEdge, side, { x: 0, y: lowest }), 'sideEdge', 'centreEdge', {
    role: 'free',
    say: 'Draw the lower edge square to the side and the centre',
    uses: names,
    through: ['underarm', 'centreNeck'],
  })
  centreEdge(facing, onFold, 'centreEdge')
  finishFacing(facing, onFold)
  return facing
}

/** From the side to the centre, square to both where one bend allows it. */
function lowerEdge(
  from: { x: number; y: number },
  side: { x: number; y: number },
  to: { x: number; y: number },
): Path {
  const leaves = { x: -side.y, y: side.x }
  const fair = fairCurve(from, leaves, to, { x: -1, y: 0 })
  if (fair) return fair
  const third = (from.x - to.x) / 3
  return {
    closed: false,
    segments: [
      {
        kind: 'cubic',
        from,
        control1: { x: from.x + leaves.x * third, y: from.y + leaves.y * third },
        control2: { x: to.x + third, y: to.y },
        to,
      },
    ],
  }
}

/** Marks traced from the body, so that corrections there follow here. */
function copyMarks(facing: PiecePen, body: PiecePen, ids: readonly string[], uses: bigint): void {
  for (const id of ids) facing.trace(id, body, uses)
}

function centreEdge(facing: PiecePen, onFold: boolean, from: string): void {
  facing.line('centre', from, 'centreNeck', {
    role: onFold ? 'fold' : 'opening',
    ...(onFold ? {} : { allowance: 'centreBackAllowance' }),
    say: onFold ? 'The centre lies on the fold' : 'The centre is turned in beside the zip',
  })
}

function finishFacing(facing: PiecePen, onFold: boolean): void {
  cutFacing(facing, onFold)
  const top = facing.at('centreNeck')
  const bottom = facing.at('centreEdge')
  const inset = Math.min(14, Math.abs(facing.at('sideNeck').x) / 3)
  const column = straight({ x: inset, y: -200 }, { x: inset, y: 2000 })
  const upper = intersections(facing.edge('neckline').path, column)[0]?.point.y ?? top.y
  const lower = intersections(facing.edge('outer').path, column)[0]?.point.y ?? bottom.y
  facing.grain({ x: inset, y: upper + 5 }, { x: inset, y: Math.max(upper + 15, lower - 5) })
  // A zip needs the facing a little clear of its teeth; the turn is marked, the neckline stays whole.
  if (!onFold && facing.at('centreEdge').y - top.y > 10) {
    facing.inner(
      'zip-turn',
      'turn',
      { closed: false, segments: [{ kind: 'line', from: { x: 4, y: top.y }, to: { x: 4, y: bottom.y } }] },
      'Turn in 4 mm short of the centre, clear of the zip',
      facing.usesOf('centreNeck', 'centreEdge'),
    )
  }
}
