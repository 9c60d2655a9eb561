import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { fits } from '../support/laws/law-3-fits'

describe('Law 3: fits are what is drawn and keep their promise', () => holdsForDrafts(fits))
