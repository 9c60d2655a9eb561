import { DraftingError, draftGarment, garments } from '@/drafting'
import { sketch } from '@/drafting/sketch'
import { type Picture, pictureOf } from '@/drafting/sketch/picture'
import { middleSize } from './published-sizes'

export interface PicturedGarment {
  readonly id: string
  readonly name: string
  /** Missing when the garment cannot be drawn on a published size alone. */
  readonly picture: Picture | undefined
}

let drawn: readonly PicturedGarment[] | undefined

/** Every garment with its picture: drawn on the middle published size, once for the life of the process. */
export function picturedGarments(): readonly PicturedGarment[] {
  return (drawn ??= garments.map(({ id, name }) => ({ id, name, picture: drawnOnMiddleSize(id) })))
}

function drawnOnMiddleSize(garment: string): Picture | undefined {
  try {
    return pictureOf(sketch(draftGarment({ garment, measurements: middleSize().card, explain: false })))
  } catch (error) {
    if (error instanceof DraftingError) return undefined
    throw error
  }
}
