import type { Path, Point } from '../contract'
import { endOf, endTangent, startOf, startTangent } from './ends'
import { parameterAt, segmentLength } from './length'
import { recent } from './recent'
import { evaluate, tangentAt } from './segment'

/** Length so far after each segment; the last entry is the whole. */
export const lengthsOf = recent((path: Path): Float64Array => {
  const table = new Float64Array(path.segments.length)
  let sum = 0
  for (let i = 0; i < table.length; i++) table[i] = sum += segmentLength(path.segments[i]!)
  return table
})

/** Length in mm. */
export const pathLength = (path: Path): number => {
  const table = lengthsOf(path)
  return table.length > 0 ? table[table.length - 1]! : 0
}

/** mm along the path at which the numbered segment starts. */
export const lengthBefore = (path: Path, segment: number): number =>
  segment > 0 ? lengthsOf(path)[segment - 1]! : 0

/** The point so many mm along the path; its exact ends before the start and past the end. */
export const pointAt = (path: Path, distance: number): Point => {
  const table = lengthsOf(path)
  const last = table.length - 1
  if (last < 0 || !(distance > 0)) return startOf(path)
  if (distance >= table[last]!) return endOf(path)
  let i = 0
  while (table[i]! <= distance) i++
  const segment = path.segments[i]!
  return evaluate(segment, parameterAt(segment, i > 0 ? distance - table[i - 1]! : distance))
}

/** Unit vector of travel so many mm along the path. */
export const tangentOn = (path: Path, distance: number): Point => {
  const table = lengthsOf(path)
  const last = table.length - 1
  if (last < 0 || !(distance > 0)) return startTangent(path)
  if (distance >= table[last]!) return endTangent(path)
  let i = 0
  while (table[i]! <= distance) i++
  const segment = path.segments[i]!
  return tangentAt(segment, parameterAt(segment, i > 0 ? distance - table[i - 1]! : distance))
}
