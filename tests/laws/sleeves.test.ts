import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { sleeves } from '../support/laws/law-7-sleeves'

describe('Law 7: sleeve heads fit their armholes, mouths open as asked', () => holdsForDrafts(sleeves))
