import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { openings } from '../support/laws/law-17-openings'

describe('Law 17: openings let neck, head and arm through', () => holdsForDrafts(openings))
