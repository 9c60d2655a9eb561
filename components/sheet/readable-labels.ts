import type { DrawingItem } from '@/drafting/contract'
import { boundsOf } from '@/drafting/drawing/bounds'

/** px: smaller type is a grey line, not words. */
const least = 7
/** px: a name that found no room in its piece, and how far below the piece it stands. */
const nameSize = 12
const below = 6

type Label = Extract<DrawingItem, { kind: 'text' }>

/**
 * Keeps the labels that can be read at this zoom. A piece too small for its own name has it written below, large enough.
 * @param scale px a mm
 */
export function readableLabels(items: readonly DrawingItem[], scale: number): readonly DrawingItem[] {
  return items.flatMap((item) => {
    if (item.kind !== 'text' || item.layer === 'dimension' || item.size * scale >= least) return [item]
    return item.style === 'label-name' ? [nameBelow(item, items, scale)] : []
  })
}

function nameBelow(name: Label, items: readonly DrawingItem[], scale: number): Label {
  const lines = items.filter((item) => item.kind === 'path' && item.piece === name.piece)
  const { min, max } = boundsOf(lines)
  const at = { x: (min.x + max.x) / 2, y: max.y + (nameSize + below) / scale }
  return { ...name, at, turn: 0, size: nameSize / scale }
}
