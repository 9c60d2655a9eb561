import type { DraftingMethod } from '../contract'
import { freehand } from './freehand'
import { handbook } from './handbook'

/** The drafting methods that are built in; the first is what a draft follows when nothing else is chosen. */
export const methods: readonly DraftingMethod[] = [freehand, handbook]

/** The built-in method of that id, or undefined. */
export function methodById(id: string): DraftingMethod | undefined {
  return methods.find((method) => method.id === id)
}
