import type { Draft } from '@/drafting/contract'
import { placeTransform, type Places } from '@/drafting/drawing'
import { applyTo } from '@/drafting/geometry/transform'
import { placeTags, type Box, type TagWish } from './tag-places'
import { toScreen, type Size, type View } from './view'

/** px: a tag's figures are this wide each, and its frame adds this much. */
const figure = 7.2
const frame = 18
const height = 26

/** px from the window's edge within which a tag's words open inwards. */
const nearEdge = 130

/** Where the tags below `area` want to sit in this view. Those that can be typed in come first. */
function tagWishes(area: HTMLElement, draft: Draft, places: Places, view: View): readonly TagWish[] {
  const dimensions = new Map(draft.dimensions.map((dimension) => [dimension.id, dimension]))
  const wishes = [...area.querySelectorAll<HTMLElement>('[data-tag]')].flatMap((element) => {
    const dimension = dimensions.get(element.dataset.tag ?? '')
    if (!dimension) return []
    const transform = placeTransform(places[dimension.piece])
    const wish: TagWish = {
      id: dimension.id,
      from: toScreen(view, applyTo(transform, dimension.from)),
      to: toScreen(view, applyTo(transform, dimension.to)),
      width: frame + figure * textLength(element),
      height,
    }
    return [{ wish, first: dimension.shows === 'value' }]
  })
  return [...wishes.filter((each) => each.first), ...wishes.filter((each) => !each.first)].map(
    (each) => each.wish,
  )
}

function textLength(element: HTMLElement): number {
  const input = element.querySelector('input')
  if (input) return figuresOf(input.value) + 1
  return figuresOf(element.querySelector('span')?.textContent ?? '0000')
}

/** A fraction is set in small figures over each other: it takes the room of two, with the space before it. */
const figuresOf = (text: string) => text.replace(/\s?\d+[⁄/]\d+/, '00').length

/** Puts each tag below `area` at its place, clear of the points, without asking React. */
export function placeTagElements(
  area: HTMLElement,
  size: Size,
  draft: Draft,
  places: Places,
  view: View,
  points: readonly Box[],
): void {
  const placed = placeTags(tagWishes(area, draft, places, view), points, size)
  const byId = new Map(placed.map((place) => [place.id, place]))
  for (const element of area.querySelectorAll<HTMLElement>('[data-tag]')) {
    const place = byId.get(element.dataset.tag ?? '')
    element.hidden = !place
    if (!place) continue
    element.style.transform = `translate(${Math.round(place.x)}px, ${Math.round(place.y)}px)`
    element.toggleAttribute('data-folded', place.folded)
    element.dataset.edge = place.x < nearEdge ? 'left' : place.x > size.width - nearEdge ? 'right' : ''
  }
}
