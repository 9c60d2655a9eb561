import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { letHeadThrough } from './head-room'
import { onFold, type Opening } from './opening'

/** Common practice: a zip under the arm begins so far below the armhole, mm, where it does not rub. */
const belowArmhole = 30
/** And ends so far above the hem, mm. */
const aboveHem = 60

/** A zip in the left side seam, for a garment that the body would not get through otherwise; both centres on the fold. */
export const sideZip: Opening = {
  draw: (pen, front, back, dropped) => {
    onFold(front)
    onFold(back)
    zipInSide(pen, front.piece, back.piece, belowArmhole)
    return { front: { kind: 'fold' }, back: letHeadThrough(pen, front.piece, back.piece, dropped) }
  },
}

/**
 * Marks a zip in the side seam of two halves with notches at both ends, and shortens it where the seam is too short.
 *
 * @param from mm from the top of the seam to where the zip begins.
 */
function zipInSide(pen: Pen, front: PiecePen, back: PiecePen, from: number): void {
  const asked = pen.length('zipLength')
  const room = front.lengthOf('side') - from - aboveHem
  const zip = Math.min(asked, room)
  if (zip < asked) {
    pen.caution(
      'zip-shortened',
      `A zip that long would run into the hem, so the opening is drawn ${pen.say(zip)} long.`,
      'zipLength',
      'length',
    )
  }
  for (const piece of [front, back]) {
    piece.notch('zip-top', 'side', from, 2)
    piece.notch('zip-end', 'side', from + zip, 2)
  }
  pen.notion({ kind: 'zip', length: zip, count: 1 })
}
