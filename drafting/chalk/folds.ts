import type { Cutting, Piece } from '../contract'
import { bounds } from '../geometry'
import type { Say } from './guide'

/** How the cloth lies for a piece. */
export interface ChalkFold {
  readonly layers: 1 | 2 | 4
  /** Whether an edge of the piece lies on a fold. */
  readonly onFold: boolean
  /** What to do, in order. */
  readonly words: readonly string[]
  /** Cloth that the piece takes as it lies, with its allowances, mm: along the grain and across it. */
  readonly takes: { readonly along: number; readonly across: number }
}

/** The fold for what is cut from the main cloth. */
export function foldOf(piece: Piece, say: Say): ChalkFold {
  const cutting = piece.cut.find(({ cloth }) => cloth === 'main')
  const takes = takenBy(piece)
  const layers = layersOf(cutting)
  const onFold = cutting?.onFold ?? false
  const room = `It takes ${say(takes.along)} along the grain and ${say(takes.across)} across, as it lies.`
  return { layers, onFold, takes, words: [...foldWords(layers, onFold, cutting), room] }
}

function layersOf(cutting: Cutting | undefined): 1 | 2 | 4 {
  if (!cutting) return 1
  const each = cutting.onFold ? 2 : 1
  if (cutting.count * each >= 4) return 4
  return cutting.count * each >= 2 ? 2 : 1
}

function foldWords(layers: 1 | 2 | 4, onFold: boolean, cutting: Cutting | undefined): readonly string[] {
  if (onFold && layers === 2)
    return [
      'Fold the cloth once along the grain, right side inside.',
      'The centre of the piece lies on the fold.',
    ]
  if (onFold)
    return [
      'Fold the cloth once along the grain, right side inside, and then once more, so that two folds lie on each other.',
      'The centre of the piece lies on the folds.',
    ]
  if (layers === 4)
    return [
      'Fold the cloth once along the grain, right side inside, then once across: four layers.',
      'The piece lies clear of the folds, its grain along the cloth.',
    ]
  if (layers === 2)
    return [
      'Fold the cloth once along the grain, right side inside: two layers.',
      `The piece lies clear of the fold, its grain along the cloth${cutting?.handed ? '; the layers give a left and a right' : ''}.`,
    ]
  return ['Lay the cloth single, right side up.', 'The grain of the piece runs along the cloth.']
}

/** The box around the cut line, along the grain and across it. */
function takenBy(piece: Piece): ChalkFold['takes'] {
  const { min, max } = bounds(piece.cutLine)
  const [wide, high] = [max.x - min.x, max.y - min.y]
  const { from, to } = piece.grain
  const upright = Math.abs(to.y - from.y) >= Math.abs(to.x - from.x)
  return upright ? { along: high, across: wide } : { along: wide, across: high }
}
