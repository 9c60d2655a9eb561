import type { DesignValue, RuleDefinition } from '../../contract'
import { choice, length } from '../../pen/design'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { chosenNeckline } from '../necklines'
import { buttonBand, buttonDesign, buttonRules } from './button-band'

export { buttonRules }
import { centreBackZip } from './centre-back-zip'
import { drawDrop } from './drop'
import { frontSlit, frontSlitDesign } from './front-slit'
import { headRules } from './head-room'
import { keyhole, keyholeDesign } from './keyhole'
import { none } from './none'
import type { Centre, Centres, OpenHalf, Opening } from './opening'
import { sideZip } from './side-zip'

/** The openings by their names in the style. */
const openings: Readonly<Record<string, Opening>> = {
  zip: centreBackZip,
  none,
  'button band': buttonBand,
  keyhole,
  'side zip': sideZip,
  'front slit': frontSlit,
}

/**
 * The style values of the openings that a garment offers; the first is its usual one.
 *
 * @param zip length of its zip unless the style says otherwise, mm.
 */
export function openingDesign(offered: readonly [string, ...string[]], zip = 380): readonly DesignValue[] {
  const values = [
    length(
      'zipLength',
      'Zip length',
      'opening',
      { default: zip, min: 150, max: 500 },
      { id: 'backOpening', is: ['zip', 'side zip'] },
    ),
    ...buttonDesign,
    ...keyholeDesign,
    ...frontSlitDesign,
  ]
  return [
    choice('backOpening', 'Opening', 'opening', offered),
    ...values.filter(({ when }) => when?.is.some((name) => offered.includes(String(name)))),
  ]
}

export const openingRules: readonly RuleDefinition[] = [...headRules, ...buttonRules]

/** Draws both centres of a body, and with them the way into it. */
export function drawOpening(pen: Pen, front: OpenHalf, back: OpenHalf): Centres {
  const opening = openings[String(pen.chosen('backOpening'))]
  if (!opening) throw new Error('Every opening offered has its kind.')
  const value = chosenNeckline(pen).keyhole
  const depth = value ? pen.length(value) : 0
  const centres = opening.draw(pen, front, back, depth)
  return { ...centres, front: withKeyhole(pen, front.piece, centres.front) }
}

/** Draws the keyhole of a keyhole neckline on a front that lies on the fold; one that is sewn or opens has none, and it is said. */
export function withKeyhole(pen: Pen, front: PiecePen, centre: Centre): Centre {
  const value = chosenNeckline(pen).keyhole
  if (!value) return centre
  if (centre.kind === 'fold') return { ...centre, keyhole: drawDrop(pen, front, value) }
  pen.caution(
    'keyhole-left-out',
    'The centre front is a seam or an edge, so no keyhole is drawn in it. Put the dart or the opening elsewhere for a keyhole.',
    'neckShape',
    'backOpening',
  )
  return centre
}
