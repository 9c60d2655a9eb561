import type { Run } from '../../contract'
import { pathLength } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight } from '../../pen/piece-pen'
import type { Bodice } from '.'
import type { BodiceHalf } from './half'

/** How a bodice fits: the waist with its darts closed, and the width of the back at the underarm. */
export function fitBodice(pen: Pen, { front, back }: Bodice): void {
  const across = ({ pieces }: BodiceHalf, { piece, edge }: Run) => {
    const drawn = pieces.find(({ id }) => id === piece)?.edge(edge)
    if (!drawn) throw new Error(`The bodice has no edge “${edge}”.`)
    return { piece, path: drawn.path, times: 2, length: pathLength(drawn.path) }
  }
  const waists = [front, back].flatMap((half) => half.waist.map((run) => across(half, run)))
  const drawn = waists.reduce((sum, one) => sum + one.times * one.length, 0)
  const asked = pen.value('waistEase')
  // What corrections take in is no longer the ease that was asked for.
  const relation = Math.abs(drawn - pen.value('waist') - asked) > 0.5 ? 'shown' : 'equal'
  pen.fit(fitAcross('waist', relation, asked, pen.value('waist'), waists))
  const [centre] = back.pieces
  if (!centre || back.pieces.length > 1) return
  const end = centre.at('underarm')
  const level = straight({ x: 0, y: end.y }, end)
  pen.fit(
    fitAcross('back-width', 'shown', 0, undefined, [{ piece: 'back', path: level, times: 2, length: end.x }]),
  )
}
