import type { Draft, Handle, Point } from '@/drafting/contract'
import { placeTransform, type Places } from '@/drafting/drawing'
import { applyTo } from '@/drafting/geometry/transform'
import { markAt } from './drag-point'
import type { Box } from './tag-places'
import { toScreen, type View } from './view'

/** px about a point that tags leave free: half of the least target. */
const room = 12

/**
 * Puts each point below `area` on its mark, without asking React. Where two would lie under one finger the later waits until the view is
 * closer; its tag does the same.
 * @returns the room that the shown points take, px
 */
export function placePointElements(
  area: HTMLElement,
  draft: Draft,
  handles: readonly Handle[],
  places: Places,
  view: View,
): readonly Box[] {
  const taken: Box[] = []
  for (const element of area.querySelectorAll<HTMLElement>('[data-point]')) {
    const own = handles.find((each) => each.id === element.dataset.point)
    const mark = own && markAt(draft, own.piece, own.mark)
    const at = own && mark && toScreen(view, applyTo(placeTransform(places[own.piece]), mark))
    const held = element.contains(document.activeElement)
    element.hidden = !at || (!held && taken.some((other) => crowds(other, at)))
    if (!at || element.hidden) continue
    element.style.transform = `translate(${at.x}px, ${at.y}px)`
    taken.push({ x: at.x - room, y: at.y - room, width: 2 * room, height: 2 * room })
  }
  return taken
}

/** Whether a point at `at` would lie in the room of another. */
function crowds(other: Box, at: Point): boolean {
  return Math.abs(other.x + room - at.x) < 2 * room && Math.abs(other.y + room - at.y) < 2 * room
}
