import type { DesignValue } from '../../contract'
import { length } from '../../pen/design'
import { drawDrop } from './drop'
import { roomUses, slitForHead } from './head-room'
import { onFold, type Opening } from './opening'

const asked = { id: 'backOpening', is: ['keyhole'] }

export const keyholeDesign: readonly DesignValue[] = [
  length('backKeyhole', 'Back keyhole, depth', 'opening', { default: 110, min: 60, max: 220 }, asked),
]

/** A keyhole at the back of the neck, closed with a loop and a button; both centres on the fold. */
export const keyhole: Opening = {
  draw: (pen, front, back, dropped) => {
    onFold(front)
    onFold(back)
    const wanted = pen.length('backKeyhole')
    const least = slitForHead(pen, front.piece, back.piece, dropped)
    const depth = Math.max(wanted, pen.tape ? Math.ceil(least / pen.tape) * pen.tape : least)
    if (depth > wanted) {
      pen.caution(
        'keyhole-deepened',
        `The keyhole is drawn ${pen.say(depth)} deep so that the neck goes over the head. Open the neck wider for a smaller one.`,
        'backKeyhole',
        'neckWidening',
      )
    }
    const drop = drawDrop(pen, back.piece, 'backKeyhole', depth, roomUses(pen, front.piece, back.piece))
    return { front: { kind: 'fold' }, back: { kind: 'fold', keyhole: drop } }
  },
}
