import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { hasGusset } from './room'

/**
 * Sews front to back from the sleeve under the arm and down the side, with a square gusset between where there is one: two of
 * its sides to the front, two to the back, its corners at the corners under the arm.
 */
export function sewUnderarm(pen: Pen, front: PiecePen): void {
  const run = (piece: string, edge: string, from?: number, to?: number) => ({
    piece,
    edge,
    ...(from === undefined ? {} : { from }),
    ...(to === undefined ? {} : { to }),
  })
  if (!hasGusset(pen)) {
    pen.sew({
      id: 'underarm',
      name: 'Sleeve and side',
      a: [run('front', 'side')],
      b: [run('back', 'side')],
      smooth: true,
    })
    return
  }
  const side = pen.length('gussetSide')
  const sleeve = front.lengthOf('sleeve-under') - side
  pen.sew({
    id: 'underarm-sleeve',
    name: 'Underside of the sleeve',
    a: [run('front', 'sleeve-under', undefined, sleeve)],
    b: [run('back', 'sleeve-under', undefined, sleeve)],
    smooth: true,
  })
  pen.sew({
    id: 'underarm-side',
    name: 'Side seam',
    a: [run('front', 'side', side)],
    b: [run('back', 'side', side)],
    smooth: true,
  })
  drawGusset(pen)
  for (const half of ['front', 'back'] as const) {
    const reversed = half === 'front' ? { reversed: true } : {}
    pen.sew({
      id: `gusset-${half}-sleeve`,
      name: `Gusset to the ${half} sleeve`,
      a: [run(half, 'sleeve-under', sleeve)],
      b: [{ ...run('gusset', `${half}-sleeve`), ...reversed }],
    })
    pen.sew({
      id: `gusset-${half}-side`,
      name: `Gusset to the ${half} side`,
      a: [run(half, 'side', undefined, side)],
      b: [{ ...run('gusset', `${half}-side`), ...reversed }],
    })
    const piece = pen.pieces.find((one) => one.id === half)
    const ticks = half === 'front' ? 1 : 2
    piece?.notch('gusset-sleeve', 'sleeve-under', sleeve, ticks)
    piece?.notch('gusset-side', 'side', side, ticks)
  }
  pen.caution(
    'gusset-corner',
    'Before the corners under the arm are snipped for the gusset, back them with a patch: they carry the strain.',
    'gusset',
  )
}

/** A square on the bias; its corners meet the ends of the seams and the corners under the arm. */
function drawGusset(pen: Pen): void {
  const gusset = pen.piece('gusset', 'Gusset')
  gusset.start('frontCorner', { x: 0, y: 0 }, 'Mark the corner that meets the front')
  gusset.go('sleeveCorner', 'frontCorner', 'right', 'gussetSide', {
    say: 'Go along one side',
    drag: ['gussetSide'],
  })
  gusset.go('sideCorner', 'frontCorner', 'down', 'gussetSide', { say: 'Come down the next' })
  gusset.square('backCorner', 'sleeveCorner', 'sideCorner', {
    say: 'Square to the corner that meets the back',
  })
  pen.tag({ piece: 'gusset', from: 'frontCorner', to: 'sleeveCorner', label: 'Side', value: 'gussetSide' })
  const seam = { role: 'seam', allowance: 'sideAllowance' } as const
  gusset.line('front-sleeve', 'frontCorner', 'sleeveCorner', {
    ...seam,
    say: 'Sewn to the front of the sleeve',
  })
  gusset.line('back-sleeve', 'sleeveCorner', 'backCorner', { ...seam, say: 'Sewn to the back of the sleeve' })
  gusset.line('back-side', 'backCorner', 'sideCorner', { ...seam, say: 'Sewn to the back side' })
  gusset.line('front-side', 'sideCorner', 'frontCorner', { ...seam, say: 'Sewn to the front side' })
  const far = gusset.at('backCorner').x
  gusset.grain({ x: far * 0.25, y: far * 0.25 }, { x: far * 0.75, y: far * 0.75 })
  gusset.cut({ cloth: 'main', count: 2, onFold: false, handed: false })
}
