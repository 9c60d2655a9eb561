import type { Draft, DrawingItem, Piece } from '../contract'
import { pathItem, textItem } from './items'
import { cross } from './mark-items'
import { point } from '../geometry/point'

/** What the drafter drew on the way: the lines of each step and the marks they were measured from, with their letters. */
export function constructionItems(piece: Piece, draft: Draft): readonly DrawingItem[] {
  const lines = draft.steps
    .filter((step) => step.piece === piece.id && !step.edge)
    .flatMap((step) =>
      step.draws.map((path, index) =>
        pathItem(piece, 'construction', `${step.id}-${index}`, 'construction', path),
      ),
    )
  const marks = piece.marks
    .filter((mark) => mark.kind === 'construction')
    .flatMap((mark) => [
      ...cross(mark.at, 2).map((path, index) =>
        pathItem(piece, 'construction', `mark-${mark.id}-${index}`, 'construction', path),
      ),
      ...(mark.letter
        ? [
            textItem(
              piece,
              'construction',
              `letter-${mark.id}`,
              'label-small',
              mark.letter,
              point(mark.at.x + 3.5, mark.at.y - 1.5),
              4,
            ),
          ]
        : []),
    ])
  return [...lines, ...marks]
}
