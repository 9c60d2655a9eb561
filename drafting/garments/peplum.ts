import { choice, length, share } from '../pen/design'
import { garment, geometry, lengthRule } from '../pen/garment'
import { fitAcross, type Pen } from '../pen/pen'
import { shares } from '../parts/skirts/circle'
import { drawCircleHalves } from '../parts/skirts/circle-halves'
import { gathered } from '../parts/skirts/gathered'
import type { SkirtUse } from '../parts/skirts/skirt'

const cut = (is: string) => ({ id: 'cut', is: [is] })

/**
 * A short skirt piece to be sewn to the waist of a bodice or blouse: round, or gathered. A full circle hangs in deep folds, a
 * quarter lies almost flat. Common practice, no published source.
 */
export const peplum = garment({
  id: 'peplum',
  name: 'Peplum',
  needs: ['waist'],
  estimates: ['hip', 'waistToHip', 'bust', 'height'],
  design: [
    choice('cut', 'Cut', 'skirt', ['round', 'gathered']),
    choice('share', 'Share of a circle', 'skirt', ['1/2', '1/4', '3/4', '1'], cut('round')),
    share(
      'fullness',
      'Fullness, times the waist',
      'skirt',
      { default: 1.8, min: 1.5, max: 2.5 },
      cut('gathered'),
    ),
    length('length', 'Length from the waist', 'skirt', { default: 160, min: 100, max: 350 }),
    length('waistEase', 'Waist ease', 'skirt', { default: 40, min: 10, max: 120 }),
    length('hipEase', 'Hip ease', 'skirt', { default: 50, min: 0, max: 150 }),
    choice('opening', 'Opening', 'opening', ['open centre back', 'none']),
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 12.7, min: 0, max: 20 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 30 }),
    length(
      'centreBackAllowance',
      'Centre back allowance',
      'allowances',
      { default: 15, min: 0, max: 30 },
      { id: 'opening', is: ['open centre back'] },
    ),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 10, min: 0, max: 25 }),
  ],
  rules: [
    lengthRule('waistEdge', 'Waist edge', 'waist + waistEase', geometry),
    lengthRule('frontWaistHalf', 'Half the front waist', '(waist + waistEase) / 4 + 0.5cm'),
    lengthRule('backWaistHalf', 'Half the back waist', '(waist + waistEase) / 4 - 0.5cm'),
    ...gathered.rules.filter(({ id }) =>
      ['gatheredQuarter', 'hipLine', 'gathering', 'gatheringDrawn'].includes(id),
    ),
  ],
  found: { circleShare: 'number', ...gathered.found },
  draft(pen) {
    const use = sewnOn(pen)
    if (pen.chosen('cut') === 'gathered') {
      gathered.draw(pen, use)
      return
    }
    pen.find('circleShare', shares[String(pen.chosen('share'))] as number, pen.usesOf(['share']))
    drawCircleHalves(pen, use)
    fitWaist(pen)
  },
})

/** The waist that it is to be sewn to: that of a bodice with the same ease. */
function sewnOn(pen: Pen): Required<SkirtUse> {
  const half = (side: 'front' | 'back') => ({ length: pen.value(`${side}WaistHalf`), joints: [] })
  return {
    prefix: '',
    opening: String(pen.chosen('opening')),
    zip: '',
    origin: 0,
    peplum: true,
    sewnTo: {
      front: half('front'),
      back: half('back'),
      uses: pen.usesOf(['frontWaistHalf', 'backWaistHalf']),
    },
  }
}

function fitWaist(pen: Pen): void {
  const across = pen.pieces.map((piece) => ({
    piece: piece.id,
    path: piece.edge('waist').path,
    times: 2,
    length: piece.lengthOf('waist'),
  }))
  pen.fit(fitAcross('waist', 'equal', pen.value('waistEase'), pen.value('waist'), across))
}
