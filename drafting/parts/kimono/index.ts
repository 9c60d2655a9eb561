import type { Path } from '../../contract'
import { startTangent } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { faceNeckAndArmholes } from '../facings'
import type { Faced } from '../facing'
import { neckLeans } from '../neck-lean'
import { drawOpening } from '../openings'
import { fitKimono } from './fits'
import { sewUnderarm } from './gusset'
import { drawKimonoHalf, kimonoMarks, straightLower, type StraightWay } from './half'
import { makeRoom } from './room'

export { kimonoDesign, kimonoFound, kimonoRules } from './design'

/**
 * Draws a body with the sleeves in one: both halves, opening, seams with their gusset, fits and neck facings. The garment
 * states `kimonoDesign` and `kimonoRules`, and rules for `neckWidth`, `halfShoulder`, `armholeDepth`, `kimonoQuarter`,
 * `lengthDrawn`, `slitDrawn`, `frontDip` and `hipLevel`.
 */
export function drawKimonoBody(
  pen: Pen,
  way: StraightWay,
): { readonly front: PiecePen; readonly back: PiecePen } {
  makeRoom(pen)
  const front = pen.piece('front', 'Front')
  const back = pen.piece('back', 'Back')
  for (const [piece, side] of [
    [front, 'front'],
    [back, 'back'],
  ] as const) {
    kimonoMarks(pen, piece, side)
    straightLower(pen, piece, way)
  }
  front.go('centreHem', 'lengthMark', 'down', 'frontDip', {
    say: 'Lower the centre front by what the bust takes up',
  })
  const leans = neckLeans(pen, front, back)
  const necks = front.usesOf('centreNeck', 'sideNeck') | back.usesOf('centreNeck')
  drawKimonoHalf(pen, front, 'front', leans.front, necks, 'centreHem', way)
  drawKimonoHalf(pen, back, 'back', leans.back, necks, 'lengthMark', way)
  const below = way.banded
    ? ({ edge: 'hem', role: 'seam', allowance: 'sideAllowance' } as const)
    : ({ edge: 'hem', role: 'hem', allowance: 'hemAllowance' } as const)
  const centres = drawOpening(
    pen,
    { piece: front, foot: 'centreHem', below },
    { piece: back, foot: 'lengthMark', below },
  )
  for (const [piece, { kind }] of [
    [front, centres.front],
    [back, centres.back],
  ] as const) {
    const onFold = kind === 'fold'
    piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
    const long = piece.at('lengthMark').y
    piece.grain({ x: 60, y: long * 0.5 }, { x: 60, y: long * 0.85 })
  }
  pen.sew({
    id: 'shoulder',
    name: 'Shoulder and sleeve',
    a: [{ piece: 'front', edge: 'shoulder' }],
    b: [{ piece: 'back', edge: 'shoulder' }],
    smooth: true,
  })
  sewUnderarm(pen, front)
  fitKimono(pen, front, back)
  faceNeckAndArmholes(pen, [faced(front), centres.front], [faced(back), centres.back], false)
  return { front, back }
}

/** Without an armhole: only the neck is faced. */
function faced(piece: PiecePen): Faced {
  const neckline = piece.edge('neckline')
  const none: Path = { closed: false, segments: [] }
  const side = startTangent(piece.edge('side').path)
  return { piece, neckline: neckline.path, armhole: none, side, uses: neckline.uses }
}
