import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { squareCorners } from '../support/laws/law-4-corners'

describe('Law 4: folds are met square and sewn neighbours make one line', () => holdsForDrafts(squareCorners))
