import { describe } from 'vitest'
import { holdsForDrafts } from '../support/laws/hold'
import { seams } from '../support/laws/law-2-seams'

describe('Law 2: all seams are sewn once and agree, stretch by stretch', () => holdsForDrafts(seams))
