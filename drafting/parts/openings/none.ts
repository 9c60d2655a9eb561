import { letHeadThrough } from './head-room'
import { onFold, type Opening } from './opening'

/** Pulled on over the head: both centres on the fold, with a slit where the neck alone would not go over. */
export const none: Opening = {
  draw: (pen, front, back, dropped) => {
    onFold(front)
    onFold(back)
    return { front: { kind: 'fold' }, back: letHeadThrough(pen, front.piece, back.piece, dropped) }
  },
}
