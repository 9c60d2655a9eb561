import type { Path, Point } from '../contract'
import { endOf, reversePath, startOf, startTangent, unit } from '../geometry'
import type { Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import { between, type PiecePen } from '../pen/piece-pen'
import { fairCurve } from './hem'
import { armholeCurve } from './armhole'
import { closeFacing, copyMarks, layGrain } from './facing-centre'
import type { Centre } from './openings/opening'

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
  layGrain(facing, middle, middle + depth / 4, middle + depth / 2)
  return facing
}

/**
 * One facing for neck and armhole together, where the shoulder is too narrow for two: it covers the whole shoulder and ends
 * below the armhole.
 *
 * @param depth how far below the underarm and the neckline it ends, mm.
 */
export function shoulderFacing(pen: Pen, faced: Faced, depth: number, centre: Centre): PiecePen {
  const body = faced.piece
  const facing = pen.piece(`${body.id}-neck-facing`, `${body.name} facing, neck and armhole`)
  const through = ['centreNeck', 'sideNeck', 'shoulderTip', 'hollow', 'underarm']
  const { side } = faced
  copyMarks(facing, body, through, faced.uses)
  const underarm = body.at('underarm')
  const sideEdge = { x: underarm.x + side.x * depth, y: underarm.y + side.y * depth }
  const covered = centre.keyhole ? centre.keyhole.depth + 35 : depth
  const lowest = Math.max(body.at('centreNeck').y + covered, underarm.y + depth + 5)
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
      ...(centre.keyhole ? { mask: body.usesOf('keyholeEnd') } : {}),
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
  closeFacing(pen, facing, centre)
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
