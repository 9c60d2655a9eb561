import { DraftingError } from '../drafting-error'

/** The error for a text or number that is no length: what is wrong, and the position in the text when there is one. */
export function badLength(message: string, field: string, position?: number): DraftingError {
  return new DraftingError([
    { field, code: 'bad-length', message, ...(position === undefined ? {} : { position }) },
  ])
}
