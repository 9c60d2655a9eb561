import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { circles } from '../support/laws/law-8-circles'

describe('Law 8: circle skirts are circles', () => holdsForDrafts(circles))
