import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { steps } from '../support/laws/law-12-steps'

describe('Law 12: steps tell how everything was made', () => holdsForDrafts(steps))
