import { findMarks } from './find-marks'
import type { Spot } from './find-marks'
import type { PagePicture, Word } from './rendered'

/** A mark as found in a picture, with the name that is printed beside it. */
export interface NamedMark extends Spot {
  readonly name: string
}

/** Where a page comes to lie: turned by `turn` radians, then moved, mm. */
export interface Laid {
  readonly turn: number
  readonly x: number
  readonly y: number
}

export interface TapedPage {
  readonly name: string
  readonly picture: PagePicture
  readonly marks: readonly NamedMark[]
  readonly laid: Laid
}

/** The page's own name, as it stands largest on it: the one word of its kind. */
function nameOf(words: readonly Word[]): string {
  const names = words.filter((word) => /^[A-Z]{1,2}\d{1,2}$/.test(word.text))
  if (names.length !== 1)
    throw new Error(`A page must carry one name, found ${names.map(({ text }) => text).join(', ')}`)
  return names[0]?.text ?? ''
}

/** The marks found in a picture, each named by the nearest word that looks like a mark's name. */
export function namedMarks(picture: PagePicture, words: readonly Word[]): readonly NamedMark[] {
  const names = words.filter((word) => /^\d+[ab]$/.test(word.text))
  return findMarks(picture).map((spot) => {
    const distance = (word: Word) => Math.hypot(word.x - spot.x, word.y - spot.y)
    const nearest = names.reduce<Word | null>(
      (best, word) => (best && distance(best) <= distance(word) ? best : word),
      null,
    )
    if (!nearest || distance(nearest) > 12)
      throw new Error(`A mark at ${spot.x}, ${spot.y} has no name beside it`)
    return { ...spot, name: nearest.text }
  })
}

/** Where a spot of a page comes to lie on the table. */
export function onTable(laid: Laid, spot: Spot): Spot {
  const cos = Math.cos(laid.turn)
  const sin = Math.sin(laid.turn)
  return { x: laid.x + spot.x * cos - spot.y * sin, y: laid.y + spot.x * sin + spot.y * cos }
}

/** The turn and move that lay spots of a page on the same spots of the table, by least squares. */
function fit(own: readonly Spot[], table: readonly Spot[]): Laid {
  const mean = (spots: readonly Spot[], axis: 'x' | 'y') =>
    spots.reduce((sum, spot) => sum + spot[axis], 0) / spots.length
  const from = { x: mean(own, 'x'), y: mean(own, 'y') }
  const to = { x: mean(table, 'x'), y: mean(table, 'y') }
  let along = 0
  let across = 0
  own.forEach((spot, index) => {
    const a = { x: spot.x - from.x, y: spot.y - from.y }
    const b = { x: (table[index]?.x ?? 0) - to.x, y: (table[index]?.y ?? 0) - to.y }
    along += a.x * b.x + a.y * b.y
    across += a.x * b.y - a.y * b.x
  })
  const turn = Math.atan2(across, along)
  const turned = onTable({ turn, x: 0, y: 0 }, from)
  return { turn, x: to.x - turned.x, y: to.y - turned.y }
}

/**
 * Lays pages together as a maker does: the first one at `start`, every other by the marks that it shares with those already laid.
 * @throws Error when a page shares no marks with any other.
 */
export function tape(
  pictures: readonly PagePicture[],
  words: readonly (readonly Word[])[],
  start: Laid,
): readonly TapedPage[] {
  const waiting = pictures.map((picture, index) => ({
    name: nameOf(words[index] ?? []),
    picture,
    marks: namedMarks(picture, words[index] ?? []),
  }))
  const first = waiting.shift()
  if (!first) return []
  const taped: TapedPage[] = [{ ...first, laid: start }]
  while (waiting.length > 0) {
    const sharing = waiting.map((page) => ({ page, shared: sharedSpots(page.marks, taped) }))
    sharing.sort((a, b) => b.shared.length - a.shared.length)
    const next = sharing[0]
    if (!next || next.shared.length < 2)
      throw new Error(`No marks hold ${waiting.map(({ name }) => name).join(', ')}`)
    const laid = fit(
      next.shared.map(({ own }) => own),
      next.shared.map(({ table }) => table),
    )
    taped.push({ ...next.page, laid })
    waiting.splice(waiting.indexOf(next.page), 1)
  }
  return taped
}

function sharedSpots(
  marks: readonly NamedMark[],
  taped: readonly TapedPage[],
): readonly { own: Spot; table: Spot }[] {
  return taped.flatMap((page) =>
    page.marks.flatMap((theirs) => {
      const own = marks.find((mark) => mark.name === theirs.name)
      return own ? [{ own, table: onTable(page.laid, theirs) }] : []
    }),
  )
}
