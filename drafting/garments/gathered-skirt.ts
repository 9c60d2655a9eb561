import { choice, length, share } from '../pen/design'
import { garment, geometry, lengthRule } from '../pen/garment'
import { fitAcross, type Pen } from '../pen/pen'
import { straight } from '../pen/piece-pen'
import { pocketDesign } from '../parts/in-seam-pocket'
import { drawSkirtCentre, skirtCentreMarks } from '../parts/skirt-centre'
import { findWaist, fitHem, fitHip } from '../parts/skirt-fits'
import { bandOnSkirt, sewSkirtSides, type DrawnHalf } from '../parts/skirt-seams'
import { bandAlways, waistbandRules } from '../parts/waistband'

/**
 * Rectangles gathered into a band. Fullness, common practice: one and a half times the waist for heavy cloth, two for most, two
 * and a half for fine.
 */
export const gatheredSkirt = garment({
  id: 'gathered-skirt',
  name: 'Gathered skirt',
  needs: ['waist'],
  estimates: ['hip', 'bust', 'height', 'waistToHip'],
  design: [
    share('fullness', 'Fullness, times the waist', 'skirt', { default: 2, min: 1.5, max: 2.5 }),
    length('length', 'Length from the waist', 'skirt', { default: 650, min: 400, max: 1200 }),
    length('waistEase', 'Waist ease', 'skirt', { default: 15, min: 0, max: 60 }),
    length('hipEase', 'Hip ease', 'skirt', { default: 100, min: 20, max: 300 }),
    choice('opening', 'Opening', 'opening', ['centre-back zip', 'side zip']),
    length('zipLength', 'Zip length', 'opening', { default: 200, min: 150, max: 250 }),
    ...bandAlways,
    ...pocketDesign,
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 12.7, min: 0, max: 20 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 30 }),
    length(
      'centreBackAllowance',
      'Centre back allowance',
      'allowances',
      { default: 19, min: 0, max: 30 },
      { id: 'opening', is: ['centre-back zip'] },
    ),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 50, min: 0, max: 80 }),
  ],
  rules: [
    lengthRule('waistEdge', 'Waist of the band', 'waist + waistEase', geometry),
    lengthRule('skirtQuarter', 'Quarter of the skirt', 'waistEdge * fullness / 4'),
    lengthRule('hipLine', 'Hip below the waist', 'waistToHip'),
    ...waistbandRules.map((rule) =>
      rule.id === 'waistbandLength' ? { ...rule, formula: 'waistEdge', source: geometry } : rule,
    ),
    lengthRule('gathering', 'Gathered in', 'skirtQuarter * 4 - waistbandLength', geometry),
  ],
  found: { waistDrawn: 'length' },
  draft(pen) {
    const halves = [drawRectangle(pen, 'front'), drawRectangle(pen, 'back')]
    const [front, back] = halves as [DrawnHalf, DrawnHalf]
    sewSkirtSides(pen, front.piece, back.piece)
    findWaist(pen, halves, ['skirtQuarter'])
    bandOnSkirt(pen, halves, 'gathering')
    fitBand(pen)
    if (pen.has('hip')) fitHip(pen, halves, 'fullness', 'hipEase')
    else {
      pen.caution(
        'hip-unknown',
        'The hip was not measured, so nobody can say whether the skirt is wide enough there. Measure the hip.',
        'hip',
      )
    }
    fitHem(pen, halves)
  },
})

function drawRectangle(pen: Pen, side: 'front' | 'back'): DrawnHalf {
  const piece = pen.piece(side, side === 'front' ? 'Front' : 'Back')
  const half = { piece, side }
  piece.start('centreWaist', { x: 0, y: 0 }, 'Mark the waist on the centre')
  piece.go('hipLevel', 'centreWaist', 'down', 'hipLine', { say: 'Come down to the level of the hip' })
  piece.go('centreHem', 'centreWaist', 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  const say = 'Go across a quarter of the waist times its fullness'
  const options = { say, drag: ['fullness'], shared: true }
  // On a tape four rounded quarters would add up to more than the gathers that were asked for.
  if (pen.tape)
    piece.place(
      'sideWaist',
      { x: pen.value('skirtQuarter'), y: 0 },
      { ...options, uses: ['skirtQuarter'], stepKind: 'solve' },
    )
  else piece.go('sideWaist', 'centreWaist', 'right', 'skirtQuarter', options)
  piece.square('sideHem', 'sideWaist', 'centreHem', { say: 'Square down to the hem' })
  pen.tag({ piece: side, from: 'centreWaist', to: 'centreHem', label: 'Length', value: 'length' })
  pen.tag({ piece: side, from: 'centreWaist', to: 'sideWaist', label: 'Width', step: `${side}.sideWaist` })
  skirtCentreMarks(pen, half, 'none')
  piece.line('waist', 'centreWaist', 'sideWaist', {
    role: 'waist',
    allowance: 'waistAllowance',
    say: 'The edge that is gathered into the band',
  })
  piece.line('side', 'sideWaist', 'sideHem', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side',
  })
  piece.line('hem', 'sideHem', 'centreHem', {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Draw the hem',
  })
  drawSkirtCentre(pen, half, 'none')
  const width = piece.at('sideWaist').x
  piece.inner(
    'gather',
    'gather',
    straight({ x: 0, y: 6 }, { x: width, y: 6 }),
    'Gather between centre and side',
    piece.usesOf('sideWaist'),
    'line',
  )
  piece.grain({ x: width * 0.2, y: 60 }, { x: width * 0.2, y: piece.at('centreHem').y - 60 })
  const onFold = side === 'front' || pen.chosen('opening') === 'side zip'
  piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  return { piece, waists: ['waist'] }
}

/** The band lies on the body; the skirt hangs from it. */
function fitBand(pen: Pen): void {
  const band = pen.pieces.find((piece) => piece.id === 'waistband')
  if (!band) return
  const long = band.lengthOf('lower')
  const asked = pen.tape ? long - pen.value('waist') : pen.value('waistEase')
  const across = [{ piece: band.id, path: band.edge('lower').path, times: 1, length: long }]
  pen.fit(fitAcross('waist', 'equal', asked, pen.value('waist'), across))
}
