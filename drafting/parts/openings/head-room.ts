import type { RuleDefinition } from '../../contract'
import { lengthRule } from '../../pen/garment'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { chosenCollar } from '../collars'
import type { StandNames } from '../collars/collar'
import { topShorter } from '../collars/stand'
import { chosenNeckline } from '../necklines'
import type { Centre } from './opening'
import { straight, type PiecePen } from '../../pen/piece-pen'

export const headRules: readonly RuleDefinition[] = [
  lengthRule('headRoom', 'Opening to go over the head', 'head + 2cm'),
]

const standOf = (pen: Pen): StandNames | undefined => chosenCollar(pen)?.stands?.(pen)

/**
 * How far a slit at a centre must open the neck so that it goes over the head, mm; 0 or less when it goes over as it is.
 *
 * @param dropped mm that another slit of the neck is deep.
 */
export function slitForHead(pen: Pen, front: PiecePen, back: PiecePen, dropped: number): number {
  const half = front.lengthOf('neckline') + back.lengthOf('neckline')
  const stand = standOf(pen)
  const shorter = stand ? topShorter(half, pen.value(stand.height), pen.value(stand.rise)) : 0
  const short = pen.value('headRoom') / 2 - (half - shorter) - dropped
  // A funnel always opens: nobody pulls one over a face.
  return chosenNeckline(pen).takesCollar === 'funnel' ? Math.max(short, 1) : short
}

/** What the room for the head follows from. */
export const roomUses = (pen: Pen, front: PiecePen, back: PiecePen): Mask =>
  pen.usesOf(['headRoom', ...Object.values(standOf(pen) ?? {})]) |
  back.edge('neckline').uses |
  front.edge('neckline').uses

/**
 * Slits the centre back on the fold where the neck does not go over the head, long enough, and says so.
 *
 * @returns how that centre ends then.
 */
export function letHeadThrough(pen: Pen, front: PiecePen, back: PiecePen, dropped: number): Centre {
  const short = slitForHead(pen, front, back, dropped)
  if (short <= 0) return { kind: 'fold' }
  const long = Math.max(60, Math.ceil(short / 5) * 5)
  const top = back.at('centreNeck')
  back.inner(
    'slit',
    'placement',
    straight(top, { x: 0, y: top.y + long }),
    'Slit the centre back so that the neck goes over the head; face it and close it with a loop and button',
    roomUses(pen, front, back),
  )
  pen.notion({ kind: 'button', count: 1 })
  pen.caution(
    'slit-added',
    `The neck alone does not go over the head, so the centre back is slit ${pen.say(long)} down. Choose a zip or a wider neck to do without.`,
    'backOpening',
    'neckWidening',
  )
  return { kind: 'fold', slit: true }
}
