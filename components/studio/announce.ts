import type { Dimension, Draft } from '@/drafting/contract'
import { lengthInWords } from './lengths-in-words'
import type { Unit } from './state'

/**
 * What a change did, for the ear: 'Neck depth 4½ inches; front neckline 11¼ inches'. Names the values that changed first, then at most
 * two results that followed.
 */
export function changeInWords(
  label: string,
  before: Draft | undefined,
  after: Draft | undefined,
  unit: Unit,
): string {
  if (!after) return label
  const old = new Map(before?.dimensions.map((dimension) => [dimension.id, dimension.length]))
  const moved = after.dimensions.filter((dimension) => {
    const was = old.get(dimension.id)
    return was === undefined || Math.abs(was - dimension.length) > 0.05
  })
  const said = [
    ...moved.filter((dimension) => dimension.shows === 'value').slice(0, 2),
    ...moved.filter((dimension) => dimension.shows === 'result').slice(0, 2),
  ]
  if (said.length === 0) return label
  return said.map((dimension) => dimensionInWords(dimension, unit)).join('; ')
}

/** 'Front neckline 11¼ inches'. */
export function dimensionInWords(dimension: Dimension, unit: Unit): string {
  return `${dimension.label} ${lengthInWords(dimension.length, unit)}`
}
