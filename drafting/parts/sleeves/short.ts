import { length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import { setIn } from './set-in'
import { smoothEase, type Sleeve } from './sleeve-kind'
import { taperBlame, taperBy } from './taper'

const worn = { id: 'sleeve', is: ['short'] }

/** A short sleeve: it ends so far above the elbow, in front of a high head always with room for its hem below the underarm. */
export const short: Sleeve = {
  design: [
    length('aboveElbow', 'Hem above the elbow', 'sleeve', { default: 90, min: 20, max: 140 }, worn),
    length('shortTaper', 'Taper of the short sleeve', 'sleeve', { default: 8, min: 0, max: 15 }, worn),
  ],
  rules: [
    lengthRule(
      'shortSleeve',
      'Short sleeve: length',
      'max(elbowLevel - aboveElbow, headHeight + sleeveHemAllowance + 3cm)',
    ),
  ],
  turnedUp: true,
  draw: setIn({
    length: 'shortSleeve',
    lengthField: 'aboveElbow',
    ease: smoothEase,
    join: 'eased',
    hem: 'sweep',
    blame: taperBlame('shortTaper'),
    corners: (pen, sleeve) => {
      const asked = pen.value('elbowLevel') - pen.value('aboveElbow')
      const longer = pen.value('shortSleeve') - asked
      if (longer > 0.01) {
        pen.caution(
          'sleeve-lengthened',
          `So high above the elbow the sleeve would end at the underarm; it is drawn ${pen.say(longer)} longer.`,
          'aboveElbow',
        )
      }
      return taperBy('shortTaper')(pen, sleeve)
    },
  }),
}
