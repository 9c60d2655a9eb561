import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import type { Bodice } from '.'

/** How a bodice fits: the waist with its darts closed, and the width of the back at the underarm. */
export function fitBodice(pen: Pen, { front, back, waist }: Bodice): void {
  const across = (piece: PiecePen, edge: string) => ({
    piece: piece.id,
    path: piece.edge(edge).path,
    times: 2,
    length: piece.lengthOf(edge),
  })
  const waists = [
    ...waist.front.map(({ edge }) => across(front, edge)),
    ...waist.back.map(({ edge }) => across(back, edge)),
  ]
  pen.fit(fitAcross('waist', 'equal', pen.value('waistEase'), pen.value('waist'), waists))
  const end = back.at('underarm')
  const level = straight({ x: 0, y: end.y }, end)
  const chest = [{ piece: 'back', path: level, times: 2, length: end.x }]
  pen.fit(fitAcross('back-width', 'shown', 0, undefined, chest))
}
