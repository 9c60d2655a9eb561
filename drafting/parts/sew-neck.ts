import type { Run } from '../contract'
import { pathLength } from '../geometry'
import type { Pen } from '../pen/pen'
import type { NeckEdge, Neck } from './collars/collar'
import { chosenCollar } from './collars'
import type { FacedHalf } from './facings'

const sides = ['front', 'back'] as const
type Sides<T> = Readonly<Record<(typeof sides)[number], T>>

/**
 * Sews both necklines: to their facings, or with a collar between them, whose under layer is sewn to the body and whose upper
 * layer to the facing.
 *
 * @param runs the edges of each neckline from the centre to the shoulder, where a dart divides it.
 * @param facings ids of the two facings.
 */
export function sewNeck(
  pen: Pen,
  front: FacedHalf,
  back: FacedHalf,
  runs: Sides<readonly Run[]>,
  facings: Sides<string>,
): void {
  const halves = { front: front[0], back: back[0] }
  const long = { front: pathLength(halves.front.neckline), back: pathLength(halves.back.neckline) }
  const neck: Neck = {
    ...halves,
    long,
    centres: { front: front[1], back: back[1] },
    uses: halves.front.uses | halves.back.uses,
  }
  const lapped = front[1].kind === 'lap'
  const collar = chosenCollar(pen)?.draw(pen, neck)
  if (lapped && !collar?.over) {
    pen.sew({
      id: 'overlap-neck',
      name: 'Top of the overlap to its facing',
      a: [{ piece: 'front', edge: 'overlap-neck' }],
      b: [{ piece: facings.front, edge: 'overlap-neck' }],
      join: 'faced',
    })
  }
  if (collar) {
    sewTo(pen, collar, long.front, runs, false)
    const facing = (side: keyof typeof facings): Run[] => [{ piece: facings[side], edge: 'neckline' }]
    sewTo(pen, collar, long.front, { front: facing('front'), back: facing('back') }, true)
    return
  }
  for (const side of sides) {
    pen.sew({
      id: `${side}-neckline-facing`,
      name: `${halves[side].piece.name} neckline to its facing`,
      a: runs[side],
      b: [{ piece: facings[side], edge: 'neckline' }],
      join: 'faced',
    })
  }
}

/** Sews one layer of a collar to front and back; the notch between them meets the shoulder, one more the centre front. */
function sewTo(
  pen: Pen,
  { piece, edge, over }: NeckEdge,
  front: number,
  runs: Sides<readonly Run[]>,
  facing: boolean,
): void {
  const on: Run = { piece: piece.id, edge, ...(facing ? { mirrored: true } : {}) }
  const shoulder = over + front
  const first = runs.front[0]?.piece ?? 'front'
  const overlap: Run[] = over > 0 ? [{ piece: first, edge: 'overlap-neck' }] : []
  const name = facing ? 'facing to the upper collar' : 'neckline to the under collar'
  const id = facing ? 'facing-collar' : 'collar'
  pen.sew({
    id: `front-${id}`,
    name: `Front ${name}`,
    a: [...overlap, ...runs.front],
    b: [{ ...on, to: shoulder }],
    ...(over > 0 ? { matches: [{ a: over, b: over }] } : {}),
  })
  pen.sew({
    id: `back-${id}`,
    name: `Back ${name}`,
    a: runs.back,
    b: [{ ...on, from: shoulder, to: piece.lengthOf(edge), reversed: true }],
  })
}
