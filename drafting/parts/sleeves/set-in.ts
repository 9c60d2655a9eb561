import type { Pen } from '../../pen/pen'
import { armholeLength, armholeRuns, armholeUses, type Armhole } from './armhole'
import { drawSleeve } from './draw-sleeve'
import { fitSleeve } from './fit-sleeve'
import type { Halves, SetInKind, Sleeve } from './sleeve-kind'
import { markHead, markHem } from './straight-sleeve'

/**
 * A sleeve set into the armholes of a front and a back: its head is solved so that each half has the length of its armhole
 * and its share of the ease. Its kind then cuts, spreads or tapers it, and draws what is sewn to its hem.
 */
export const setIn =
  (kind: SetInKind): Sleeve['draw'] =>
  (pen, front, back) => {
    const sleeve = pen.piece('sleeve', 'Sleeve')
    const armhole = { front: armholeLength(front), back: armholeLength(back) }
    const head = {
      front: armhole.front + pen.value('frontHeadEase'),
      back: armhole.back + pen.value('backHeadEase'),
    }
    const uses =
      armholeUses(front) | armholeUses(back) | pen.usesOf(['biceps', 'frontHeadEase', 'backHeadEase'])
    markHead(pen, sleeve, kind.join, armhole, head, uses)
    markHem(pen, sleeve, kind)
    const ends = kind.corners(pen, sleeve, head)
    const drawn = {
      front: armhole.front + pen.value(kind.ease.front),
      back: armhole.back + pen.value(kind.ease.back),
    }
    drawSleeve(pen, sleeve, kind, drawn, ends)
    sewSleeve(pen, kind, { front, back }, drawn, armhole)
    sleeve.notch('crown', 'head-front', 0)
    fitSleeve(pen, sleeve, ends.crown)
    kind.finish?.(pen, sleeve)
  }

/**
 * Sews a head into its armholes. Smooth, there is no ease within 2 cm of the crown nor below the notches, where the cloth
 * lies flat; gathered, all of it lies between the notches.
 */
function sewSleeve(
  pen: Pen,
  kind: SetInKind,
  into: { readonly front: Armhole; readonly back: Armhole },
  head: Halves,
  armhole: Halves,
): void {
  const whole = armhole.front + armhole.back
  for (const side of ['front', 'back'] as const) {
    const notch = (side === 'front' ? 0.17 : 0.21) * whole
    pen.sew({
      id: `armhole-${side}`,
      name: `Sleeve into ${side} armhole`,
      a: [{ piece: 'sleeve', edge: `head-${side}`, ...(side === 'back' ? { reversed: true } : {}) }],
      b: armholeRuns(into[side]),
      join: kind.join,
      easeFrom: kind.ease[side],
      matches: [
        ...(kind.join === 'eased' ? [{ a: 20, b: 20 }] : []),
        { a: head[side] - notch, b: armhole[side] - notch },
      ],
      ticks: side === 'front' ? 1 : 2,
    })
  }
  pen.sew({
    id: 'sleeve-underarm',
    name: 'Sleeve underarm',
    a: [{ piece: 'sleeve', edge: 'underarm-front' }],
    b: [{ piece: 'sleeve', edge: 'underarm-back', reversed: true }],
    smooth: true,
  })
}
