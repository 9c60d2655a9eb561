import type { Draft, Edge, Path, Piece, Point } from '../contract'
import { pathLength, pointAt } from '../geometry'

/** Where one drawing of an order departs from another. */
export interface Difference {
  /** Name of the piece. */
  readonly piece: string
  /** 'side, stitching line', 'notch', 'the whole piece'… */
  readonly where: string
  /** mm at the worst place; null where one of them does not draw it at all. */
  readonly by: number | null
}

/** Two lines are looked at in so many places along their length. */
const places = 32

/**
 * Lists where two drafts of the same order are drawn differently: stitching and cutting lines edge by edge, notches and marks.
 * Texts, sums and seam checks do not count: they are not cut.
 * @param kept the draft as it was drawn before
 * @param now the draft as it is drawn today
 * @param tolerance mm; a thinner line than any pencil's by default
 * @returns the worst first; empty when nothing differs by more
 */
export function differences(kept: Draft, now: Draft, tolerance = 0.01): readonly Difference[] {
  return paired(kept.pieces, now.pieces)
    .flatMap(([before, after]): readonly Difference[] => {
      const name = (after ?? before)?.name ?? ''
      if (!before || !after) return [{ piece: name, where: 'the whole piece', by: null }]
      return pieceDifferences(before, after).map((each) => ({ piece: name, ...each }))
    })
    .filter(({ by }) => by === null || by > tolerance)
    .sort((a, b) => (b.by ?? Infinity) - (a.by ?? Infinity) || 0)
}

type Found = Omit<Difference, 'piece'>

function pieceDifferences(before: Piece, after: Piece): readonly Found[] {
  const lines = paired(before.edges, after.edges).flatMap(([one, other]): readonly Found[] => {
    const name = wordsOf((other ?? one)?.id ?? '')
    if (!one || !other) return [{ where: name, by: null }]
    return [
      { where: `${name}, stitching line`, by: apart(one.path, other.path) },
      { where: `${name}, cutting line`, by: apart(one.cut, other.cut) },
    ]
  })
  const notches = paired(before.notches, after.notches).map(([one, other]) => ({
    where: `notch on ${wordsOf((other ?? one)?.edge ?? '')}`,
    by: gap(one && notchAt(before, one), other && notchAt(after, other)),
  }))
  const marks = paired(before.marks.filter(isDrawn), after.marks.filter(isDrawn)).map(([one, other]) => ({
    where: 'a mark inside',
    by: gap(one?.at, other?.at),
  }))
  return [...lines, ...notches, ...marks]
}

const isDrawn = ({ kind }: Piece['marks'][number]) => kind !== 'construction'

const wordsOf = (id: string) => id.replaceAll('-', ' ')

/** Things of the same id beside each other; what stands on one side only is alone. */
function paired<T extends { readonly id: string }>(
  one: readonly T[],
  other: readonly T[],
): readonly (readonly [T | undefined, T | undefined])[] {
  const others = new Map(other.map((each) => [each.id, each]))
  const ids = new Set(one.map(({ id }) => id))
  return [
    ...one.map((each) => [each, others.get(each.id)] as const),
    ...other.filter(({ id }) => !ids.has(id)).map((each) => [undefined, each] as const),
  ]
}

function notchAt(piece: Piece, { edge, at }: Piece['notches'][number]): Point | undefined {
  const path = piece.edges.find((each: Edge) => each.id === edge)?.path
  return path && pointAt(path, at)
}

/** The most that two lines are apart, compared at equal shares of their length. */
function apart(one: Path, other: Path): number {
  const [first, second] = [pathLength(one), pathLength(other)]
  return Math.max(
    ...Array.from({ length: places + 1 }, (_, index) =>
      distance(pointAt(one, (first * index) / places), pointAt(other, (second * index) / places)),
    ),
  )
}

function distance(one: Point, other: Point): number {
  return Math.hypot(one.x - other.x, one.y - other.y)
}

/** Null when one of them is missing. */
function gap(one: Point | undefined, other: Point | undefined): number | null {
  return one && other ? distance(one, other) : null
}
