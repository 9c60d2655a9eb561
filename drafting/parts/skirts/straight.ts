import { length } from '../../pen/design'
import { seamPockets } from '../pockets/in-seam'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../waistband'
import { skirtBlockDesign, skirtBlockRules } from './block'
import { walkingDesign, walkingRules, type WalkingRoom } from './centre'
import { drawFitted } from './fitted'
import type { Skirt } from './skirt'

/** A skirt fitted over the hip and straight below it. */
export const straight: Skirt = {
  name: 'Straight skirt',
  needs: ['waist', 'hip'],
  estimates: ['height', 'waistToHip'],
  design: [
    ...skirtBlockDesign,
    ...walkingDesign,
    ...waistbandDesign,
    waistEasedIn,
    ...seamPockets(false),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 40, min: 0, max: 60 }),
  ],
  rules: [...skirtBlockRules, ...walkingRules, ...waistbandRules],
  found: { waistDrawn: 'length' },
  draw: (pen, use) =>
    drawFitted(pen, use, {
      close: () => 0,
      hem: (front) => ({ x: front.at('hip').x, y: front.at(front.byRule('centreHem')).y }),
      walking: pen.chosen('walkingRoom') as WalkingRoom,
      uses: [],
    }),
}
