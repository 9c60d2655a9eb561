import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { cutLines } from '../support/laws/law-6-cut-lines'

describe('Law 6: cut lines are exact offsets with the corners declared', () => {
  holdsForDrafts(cutLines, { random: false })

  describe('any style', () => holdsForDrafts(cutLines, { garments: ['circle-skirt'] }))
})
