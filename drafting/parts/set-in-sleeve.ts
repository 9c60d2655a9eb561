import type { Run } from '../contract'
import { nothing, type Mask } from '../pen/masks'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { chosenSleeve } from './sleeves'
import { drawSleeve } from './sleeves/draw-sleeve'
import { fitSleeve } from './sleeves/fit-sleeve'
import type { Halves, SleeveKind } from './sleeves/sleeve-kind'
import { straightSleeve } from './sleeves/straight-sleeve'

/** An armhole as a sleeve sees it: the edges that make it, from the shoulder to the underarm. */
export interface Armhole {
  readonly piece: PiecePen
  readonly edges: readonly string[]
}

/** The armhole of a piece that has it in one edge. */
export const wholeArmhole = (piece: PiecePen): Armhole => ({ piece, edges: ['armhole'] })

const lengthOf = ({ piece, edges }: Armhole): number =>
  edges.reduce((sum, edge) => sum + piece.lengthOf(edge), 0)
const usesOf = ({ piece, edges }: Armhole): Mask =>
  edges.reduce((mask, edge) => mask | piece.edge(edge).uses, nothing)
const runsOf = ({ piece, edges }: Armhole): Run[] => edges.map((edge) => ({ piece: piece.id, edge }))

/**
 * A sleeve set into the armholes of a front and a back: its head is solved so that each half has the length of its armhole
 * and its share of the ease. Its kind then cuts, spreads or tapers it, and draws what is sewn to its hem.
 */
export function setInSleeve(pen: Pen, front: Armhole, back: Armhole): PiecePen {
  const sleeve = pen.piece('sleeve', 'Sleeve')
  const kind = chosenSleeve(pen)
  const armhole = { front: lengthOf(front), back: lengthOf(back) }
  const head = {
    front: armhole.front + pen.value('frontHeadEase'),
    back: armhole.back + pen.value('backHeadEase'),
  }
  const uses = usesOf(front) | usesOf(back) | pen.usesOf(['biceps', 'frontHeadEase', 'backHeadEase'])
  straightSleeve(pen, sleeve, kind, armhole, head, uses)
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
  return sleeve
}

/**
 * Sews a head into its armholes. Smooth, there is no ease within 2 cm of the crown nor below the notches, where the cloth
 * lies flat; gathered, all of it lies between the notches.
 */
function sewSleeve(
  pen: Pen,
  kind: SleeveKind,
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
      b: runsOf(into[side]),
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
