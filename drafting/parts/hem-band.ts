import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'

/**
 * A straight band, folded along its lower edge, sewn to the hem of a half whose centre lies on the fold.
 *
 * @param found name of the found value for its length.
 */
function halfBand(pen: Pen, half: PiecePen, found: string): void {
  const id = `${half.id}-band`
  const band = pen.piece(id, `${half.name} hem band`)
  pen.find(found, half.lengthOf('hem'), half.edge('hem').uses)
  band.start('centre', { x: 0, y: 0 }, 'Mark the centre of the band on the fold')
  band.go('turnCentre', 'centre', 'down', 'bandDepth', { say: 'Come down the finished depth: here it folds' })
  band.go('lowCentre', 'centre', 'down', 'bandFold', {
    say: 'Come down twice the finished depth',
    drag: ['bandDepth'],
  })
  band.aim('side', 'centre', { x: 1, y: 0 }, pen.value(found), {
    say: 'Go along as far as the hem measures',
    by: found,
    stepKind: 'solve',
  })
  band.square('lowSide', 'side', 'lowCentre', { say: 'Square down to the lower edge' })
  pen.tag({ piece: id, from: 'centre', to: 'turnCentre', label: 'Band depth', value: 'bandDepth' })
  const seam = { role: 'seam', allowance: 'sideAllowance' } as const
  band.line('sewn', 'centre', 'side', { ...seam, say: 'The edge that is sewn to the hem' })
  band.line('end', 'side', 'lowSide', { ...seam, say: 'The end at the side' })
  band.line('inner', 'lowSide', 'lowCentre', {
    role: 'free',
    finish: 'turned',
    allowance: 'sideAllowance',
    say: 'The inner edge, turned in and felled down',
  })
  band.line('fold', 'lowCentre', 'centre', { role: 'fold', say: 'The centre lies on the fold' })
  const { y } = band.at('turnCentre')
  const far = { x: band.at('side').x, y }
  const uses = band.usesOf('turnCentre', 'side')
  band.inner('turn', 'turn', straight(band.at('turnCentre'), far), 'Fold the band here', uses, 'line')
  band.grain({ x: far.x * 0.3, y: y * 0.5 }, { x: far.x * 0.7, y: y * 0.5 })
  band.cut({ cloth: 'main', count: 1, onFold: true, handed: false })
  pen.sew({
    id,
    name: `${half.name} hem into its band`,
    a: [{ piece: half.id, edge: 'hem', reversed: true }],
    b: [{ piece: id, edge: 'sewn' }],
  })
}

/** Bands the hem of a front and a back on the fold; the bands meet at the sides. */
export function hemBand(pen: Pen, front: PiecePen, back: PiecePen): void {
  halfBand(pen, front, 'frontBand')
  halfBand(pen, back, 'backBand')
  pen.sew({
    id: 'hem-band-sides',
    name: 'Ends of the hem band',
    a: [{ piece: 'front-band', edge: 'end' }],
    b: [{ piece: 'back-band', edge: 'end' }],
  })
}
