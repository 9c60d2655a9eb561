import type { Path, Point } from '../contract'
import {
  cubic,
  endOf,
  intersections,
  joinPaths,
  openPath,
  pathLength,
  reversePath,
  slicePath,
  startOf,
  unit,
} from '../geometry'
import type { Pen } from '../pen/pen'
import { between, straight, type PiecePen } from '../pen/piece-pen'
import { evenBand, turnedDown } from './even-band'
import type { Faced } from './facing'
import { closeFacing, copyMarks, cutFacing, layGrain } from './facing-centre'
import type { Centre } from './openings/opening'

/** Common practice: a facing covers so much cloth below and beside a keyhole, mm. */
const aroundKeyhole = 35
/** Common practice: a front facing is so much wider than the overlap, mm, so that it carries the buttonholes. */
const besideOverlap = 40

const names = ['facingDepth']
const through = ['centreNeck', 'sideNeck', 'shoulderTip']

/**
 * The facing of one half of a neckline: a band of even depth measured from the stitched neckline, from the centre to the
 * shoulder. Its neckline is the garment's own, so it lies on it exactly. Beside a keyhole or a lapped front it turns down.
 *
 * @param depth mm.
 */
export function neckFacing(pen: Pen, faced: Faced, depth: number, centre: Centre): PiecePen {
  const body = faced.piece
  const facing = pen.piece(
    `${body.id}-neck-facing`,
    `${body.name} ${centre.kind === 'lap' ? 'and neck' : 'neck'} facing`,
  )
  const shoulder = unit(between(body.at('sideNeck'), body.at('shoulderTip')))
  const band = evenBand(faced.neckline, depth, body, shoulder)
  copyMarks(facing, body, ['centreNeck', 'sideNeck'], faced.uses)
  facing.aid('shoulderTip', body)
  facing.place('shoulderEdge', endOf(band), {
    say: 'Along the shoulder come out the depth of the facing',
    from: 'sideNeck',
    uses: names,
    through: ['sideNeck', 'shoulderTip'],
  })
  const name = body.name.toLowerCase()
  facing.curve('neckline', faced.neckline, 'centreNeck', 'sideNeck', {
    role: 'neckline',
    allowance: 'neckAllowance',
    kind: 'copy',
    say: `Trace the neckline from the ${name}. Once sewn and clipped, understitch it to its allowances 2 mm from the seam`,
    through,
  })
  facing.line('shoulder', 'sideNeck', 'shoulderEdge', {
    role: 'seam',
    allowance: 'shoulderAllowance',
    say: 'Trace the shoulder as far as the facing goes',
  })
  if (centre.kind === 'lap') downTheFront(pen, facing, faced, band, centre)
  else downTheCentre(pen, facing, faced, band, centre)
  return facing
}

function downTheCentre(pen: Pen, facing: PiecePen, faced: Faced, band: Path, centre: Centre): void {
  const outer = centre.keyhole ? tongue(band, facing.at('centreNeck'), centre.keyhole) : reversePath(band)
  const mask = centre.keyhole ? faced.piece.usesOf('keyholeEnd') : 0n
  facing.place('centreEdge', endOf(outer), {
    say: centre.keyhole
      ? 'Down the centre come below the keyhole'
      : 'Down the centre come the depth of the facing',
    from: 'centreNeck',
    uses: names,
    through,
    mask,
  })
  facing.curve('outer', outer, 'shoulderEdge', 'centreEdge', {
    role: 'free',
    say: 'Draw the outer edge even with the neckline',
    uses: names,
    through,
    mask,
  })
  closeFacing(pen, facing, centre)
}

/** The outer edge of a facing that comes down round a keyhole and is rounded below it. */
function tongue(band: Path, top: Point, keyhole: { readonly depth: number; readonly half: number }): Path {
  const half = Math.min(keyhole.half + aroundKeyhole, endOf(band).x * 0.75)
  const wanted = Math.max(top.y + keyhole.depth, startOf(band).y) + aroundKeyhole
  const side = turnedDown(band, { half, at: wanted - half * 0.6 })
  const turn = endOf(side)
  const low = Math.max(wanted, turn.y + half * 0.6)
  const bottom = { x: top.x, y: low }
  const round = cubic(
    turn,
    { x: turn.x, y: turn.y + (low - turn.y) * 0.552 },
    { x: turn.x * 0.552, y: low },
    bottom,
  )
  return joinPaths(side, openPath([round]))
}

/** A facing that runs on down a lapped front to its lower edge, overlap and all. */
function downTheFront(pen: Pen, facing: PiecePen, faced: Faced, band: Path, centre: Centre): void {
  const body = faced.piece
  const { below } = centre
  if (!below) throw new Error('A lapped front says which edge it ends on.')
  const foot = body.at('overlapFoot')
  const half = Math.min(-foot.x + besideOverlap, endOf(band).x * 0.8)
  const edge = body.edge(below.edge).path
  const met = intersections(edge, straight({ x: half, y: -2000 }, { x: half, y: 4000 }))[0]
  const centreFoot = endOf(edge)
  const bottom = met
    ? slicePath(edge, met.a, pathLength(edge))
    : straight({ x: half, y: centreFoot.y }, centreFoot)
  const outer = turnedDown(band, { half: startOf(bottom).x, at: startOf(bottom).y })
  const mask = body.edge(below.edge).uses | body.usesOf('overlapFoot')
  copyMarks(facing, body, ['overlapFoot', 'overlapNeck'], mask)
  facing.place('footEdge', startOf(bottom), {
    say: 'Along the lower edge come in the width of the facing',
    uses: names,
    through,
    mask,
  })
  facing.curve('outer', outer, 'shoulderEdge', 'footEdge', {
    role: 'free',
    say: 'Draw the outer edge even with the neckline, then down even with the front edge',
    uses: names,
    through,
    mask,
  })
  facing.curve('foot', joinPaths(bottom, straight(centreFoot, foot)), 'footEdge', 'overlapFoot', {
    role: below.role,
    allowance: below.allowance,
    ...(below.finish ? { finish: below.finish } : {}),
    kind: 'copy',
    say: `Trace the lower edge from the ${body.name.toLowerCase()}`,
    mask,
  })
  facing.line('opening', 'overlapFoot', 'overlapNeck', {
    role: 'opening',
    finish: 'seam',
    allowance: 'frontAllowance',
    kind: 'copy',
    say: `Trace the front edge from the ${body.name.toLowerCase()}`,
  })
  facing.curve('overlap-neck', body.edge('overlap-neck').path, 'overlapNeck', 'centreNeck', {
    role: 'free',
    finish: 'seam',
    allowance: 'neckAllowance',
    kind: 'copy',
    say: 'Trace the top of the overlap',
    mask: faced.uses,
  })
  cutFacing(facing, false)
  layGrain(facing, half * 0.4)
  pen.sew({
    id: 'front-edge',
    name: 'Front edge to its facing',
    a: [{ piece: body.id, edge: 'opening' }],
    b: [{ piece: facing.id, edge: 'opening' }],
    join: 'faced',
  })
}
