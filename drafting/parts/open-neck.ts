import type { Point } from '../contract'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { chosenNeckline } from './necklines'

/** A shoulder shorter than this carries nothing, mm. Common practice. */
const leastShoulder = 25

/** How far a neck is opened along a shoulder so long, mm, and how far its neckline asks for. */
export function neckOpens(pen: Pen, shoulder: number): { readonly open: number; readonly asked: number } {
  const asked = pen.length(chosenNeckline(pen).widening)
  const room = shoulder - leastShoulder
  return { asked, open: Math.min(asked, pen.tape ? Math.floor(room / pen.tape) * pen.tape : room) }
}

/**
 * Opens a neck along the shoulder: marks the side neck so far from the neck point as the neckline asks for. Where the shoulder is
 * too short for that the neck is opened less, with a caution.
 *
 * @param along unit direction of the shoulder, outwards.
 * @param shoulder length of the shorter of the two shoulders, mm.
 * @param from what the direction and the shoulder follow from: names, and marks of the piece.
 */
export function openNeck(
  pen: Pen,
  piece: PiecePen,
  along: Point,
  shoulder: number,
  from: {
    readonly uses?: readonly string[]
    readonly through?: readonly string[]
    readonly shared?: boolean
  },
): void {
  const { widening } = chosenNeckline(pen)
  const { open, asked } = neckOpens(pen, shoulder)
  const options = { say: 'Open the neck along the shoulder', shared: true, ...from }
  if (open >= asked) {
    piece.aim('sideNeck', 'neckPoint', along, asked, { ...options, by: widening, drag: ['neckWidening'] })
  } else {
    piece.aim('sideNeck', 'neckPoint', along, open, { ...options, stepKind: 'solve' })
    if (piece.id === 'front') {
      pen.caution(
        'neck-narrowed',
        `On a shoulder of ${pen.say(shoulder)} the neck is opened by ${pen.say(open)} only, so that ${pen.say(leastShoulder)} of the shoulder are left.`,
        'neckWidening',
        'neckShape',
      )
    }
  }
  pen.tag({
    piece: piece.id,
    from: 'neckPoint',
    to: 'sideNeck',
    label: 'Neck wider by',
    ...(open >= asked ? { value: 'neckWidening', over: asked - pen.value('neckWidening') } : {}),
  })
}
