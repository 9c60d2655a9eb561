import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { outlines } from '../support/laws/law-1-outlines'

describe('Law 1: stitch and cut lines are finite, closed, clockwise and simple', () =>
  holdsForDrafts(outlines))
