import { length } from '../../pen/design'
import { seamPockets } from '../pockets/in-seam'
import { patchDesign, patchFound, patchRules } from '../pockets/patch'
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
    ...patchDesign,
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 40, min: 0, max: 60 }),
  ],
  rules: [...skirtBlockRules, ...walkingRules, ...waistbandRules, ...patchRules],
  found: { ...patchFound, waistDrawn: 'length' },
  draw: (pen, use) =>
    drawFitted(pen, use, {
      close: 0,
      hem: ({ x }) => ({ x, y: pen.length('length') }),
      walking: pen.chosen('walkingRoom') as WalkingRoom,
      uses: [],
    }),
}
