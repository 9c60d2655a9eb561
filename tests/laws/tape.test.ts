import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { tape } from '../support/laws/law-19-tape'

describe('Law 19: on a tape every distance is one of its marks', () => holdsForDrafts(tape))
