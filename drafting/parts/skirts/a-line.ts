import { length, share } from '../../pen/design'
import { geometry, lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import { seamPockets } from '../pockets/in-seam'
import { patchDesign, patchFound, patchRules } from '../pockets/patch'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../waistband'
import { skirtBlockDesign, skirtBlockRules } from './block'
import { drawFitted } from './fitted'
import type { Skirt } from './skirt'
import { firstDartAngle } from './marks'

/** A fitted skirt whose first darts are partly closed, so that it opens towards the hem there and at the side. */
export const aLine: Skirt = {
  name: 'A-line skirt',
  needs: ['waist', 'hip'],
  estimates: ['height', 'waistToHip'],
  design: [
    ...skirtBlockDesign,
    share('dartClosed', 'Share of the dart closed into the hem', 'skirt', { default: 0.6, min: 0, max: 1 }),
    length('flareMore', 'More flare at the side', 'skirt', { default: 20, min: 0, max: 40 }),
    ...waistbandDesign,
    waistEasedIn,
    ...seamPockets(false),
    ...patchDesign,
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 30, min: 0, max: 50 }),
  ],
  rules: [
    ...skirtBlockRules,
    lengthRule('belowHip', 'From hip to hem', 'length - hipLine', geometry),
    lengthRule('sideFlare', 'Flare at the side', 'min(hemOpening / 2, 4cm) + flareMore'),
    ...waistbandRules,
    ...patchRules,
  ],
  found: { ...patchFound, waistDrawn: 'length', hemOpening: 'length' },
  draw: (pen, use) =>
    drawFitted(pen, use, {
      close: closing(pen),
      hem: (hip) => {
        const flare = pen.value('sideFlare')
        const drop = pen.length('length') - hip.y
        // As far from hip to hem at the side as at the centre.
        return { x: hip.x + flare, y: hip.y + Math.sqrt(drop * drop - flare * flare) }
      },
      walking: 'none',
      uses: ['dartClosed', 'sideFlare', 'belowHip'],
    }),
}

/** Common practice: a dart closed by more than this throws all fullness of the hem into one place, degrees. */
const mostClosed = 15

/** Degrees of the first darts that are closed, in front and back alike so that both hang the same; states the mouth at the hem. */
function closing(pen: Pen): number {
  const asked = pen.value('dartClosed') * Math.min(firstDartAngle(pen, 'front'), firstDartAngle(pen, 'back'))
  const close = Math.min(asked, mostClosed)
  if (close < asked - 0.01) {
    pen.caution(
      'dart-closed-less',
      `Only ${mostClosed}° of the dart are closed into the hem: more in one place would throw it into a fold.`,
      'dartClosed',
    )
  }
  const tip = pen.value('frontDartLong')
  const mouth = 2 * Math.sin((close * Math.PI) / 360) * Math.max(0, pen.value('length') - tip)
  pen.find(
    'hemOpening',
    mouth,
    pen.usesOf([
      'dartClosed',
      'frontTakes',
      'backTakes',
      'frontDarts',
      'backDarts',
      'frontDartLong',
      'backDartLong',
      'length',
    ]),
  )
  return close
}
