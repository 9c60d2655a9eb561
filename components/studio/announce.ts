import type { Dimension, Draft, EdgeRole } from '@/drafting/contract'
import { pathLength } from '@/drafting/geometry/path'
import { lengthInWords } from './lengths-in-words'
import type { Unit } from './state'

/** Less than this, mm, has not moved. */
const still = 0.05

/** Edges whose length a dressmaker listens for, and what they are called. */
const heard: Partial<Record<EdgeRole, string>> = {
  neckline: 'neckline',
  armhole: 'armhole',
  waist: 'waist edge',
  hem: 'hem',
}

interface Said {
  readonly name: string
  readonly length: number
}

/**
 * What a change did, for the ear: 'Neck depth 4½ inches; front neckline 11¼ inches'. Names the values that changed first, then at most
 * two lengths that followed.
 */
export function changeInWords(
  label: string,
  before: Draft | undefined,
  after: Draft | undefined,
  unit: Unit,
): string {
  if (!after) return label
  const values = moved(before && valuesOf(before), valuesOf(after)).slice(0, 2)
  const results = moved(before && resultsOf(before), resultsOf(after)).slice(0, 2)
  const words = [...values, ...results].map(({ name, length }) => `${name} ${lengthInWords(length, unit)}`)
  return words.length > 0 ? words.join('; ') : label
}

function moved(before: readonly Said[] | undefined, after: readonly Said[]): readonly Said[] {
  const old = new Map(before?.map((each) => [each.name, each.length]))
  const changed = after.filter(({ name, length }) => Math.abs((old.get(name) ?? -Infinity) - length) > still)
  return [...new Map(changed.map((each) => [each.name, each])).values()]
}

function valuesOf(draft: Draft): readonly Said[] {
  return draft.dimensions.filter((each) => each.shows === 'value').map(said)
}

function resultsOf(draft: Draft): readonly Said[] {
  const edges = draft.pieces.slice(0, 4).flatMap((piece) =>
    piece.edges.flatMap((edge) => {
      const part = heard[edge.role]
      if (!part) return []
      const name =
        piece.id === 'sleeve' && edge.role === 'armhole'
          ? 'sleeve head'
          : `${piece.name.toLowerCase()} ${part}`
      return [{ name, length: pathLength(edge.path) }]
    }),
  )
  return [...draft.dimensions.filter((each) => each.shows === 'result').map(said), ...edges]
}

const said = ({ label, length }: Dimension): Said => ({ name: label, length })
