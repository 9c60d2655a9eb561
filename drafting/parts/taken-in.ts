import type { Path, Point } from '../contract'
import { add, cubic, distance, line, openPath, scale, unit } from '../geometry'
import type { Pen } from '../pen/pen'
import { between } from '../pen/piece-pen'

/** Where a seam is taken in: so far down it from its top, and by how much on each layer, mm. */
export interface TakenIn {
  readonly id: string
  readonly along: number
  readonly by: number
}

/** No two places of a seam are taken in nearer to each other than this, nor nearer to its top, mm. */
const apart = 30

/**
 * Where the corrections of an order take in a straight seam, worked out on the half whose levels they are counted on; its
 * neighbour is taken in at the same lengths, so that both still have one length.
 *
 * @param below how far above its end a seam may be taken in, mm; less than nothing where its end itself may move.
 */
export function takenInOf(
  pen: Pen,
  seam: string,
  top: Point,
  bottom: Point,
  below: number,
): readonly TakenIn[] {
  const long = distance(top, bottom)
  const down = unit(between(top, bottom))
  let last = 0
  return pen.corrections.forSeam(seam).map(({ id, level, by }) => {
    const along = (level - top.y) / down.y
    if (along < last + apart || along > long - below) {
      pen.refuse({
        field: `corrections.${id}`,
        code: 'impossible-shape',
        message:
          'A side seam can be taken in between the underarm and its lower end, and no two places nearer than 3 cm. Choose a level between them.',
        min: top.y + apart * down.y,
        max: top.y + (long - below) * down.y,
      })
    }
    last = along
    return { id, along, by }
  })
}

/**
 * A seam that is straight by rule, drawn through what is taken in. Near its end the end itself is taken in.
 *
 * @returns the seam, and where each correction brought it.
 */
export function throughTakenIn(
  top: Point,
  bottom: Point,
  taken: readonly TakenIn[],
): { readonly path: Path; readonly places: readonly { readonly id: string; readonly at: Point }[] } {
  if (taken.length === 0) return { path: openPath([line(top, bottom)]), places: [] }
  const down = unit(between(top, bottom))
  const across = { x: -down.y, y: down.x }
  const long = distance(top, bottom)
  let from = top
  let start = 0
  const segments: ReturnType<typeof cubic>[] = []
  const join = (to: Point, end: number): void => {
    const reach = (end - start) / 3
    segments.push(cubic(from, add(from, scale(down, reach)), add(to, scale(down, -reach)), to))
    from = to
    start = end
  }
  const places = taken.map(({ id, along, by }) => {
    const end = along > long - apart
    const at = add(end ? bottom : add(top, scale(down, along)), scale(across, by))
    join(at, end ? long : along)
    return { id, at }
  })
  if (start < long) join(bottom, long)
  return { path: openPath(segments), places }
}
