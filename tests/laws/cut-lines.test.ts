import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { cutLines } from '../support/laws/law-6-cut-lines'

const anyStyle = [
  'flared-dress',
  'shift-dress',
  'bodice',
  'circle-skirt',
  'straight-skirt',
  'a-line-skirt',
  'gathered-skirt',
  'gored-skirt',
]

describe('Law 6: cut lines are exact offsets with the corners declared', () =>
  holdsForDrafts(cutLines, { garments: anyStyle }))
