import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { darts } from '../support/laws/law-16-darts'

describe('Law 16: darts close', () => holdsForDrafts(darts, { random: false }))
