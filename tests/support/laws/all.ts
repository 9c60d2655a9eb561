import { outlines } from './law-1-outlines'
import { seams } from './law-2-seams'
import { fits } from './law-3-fits'
import { squareCorners } from './law-4-corners'
import { smoothJoins } from './law-5-smooth-joins'
import { cutLines } from './law-6-cut-lines'
import { sleeves } from './law-7-sleeves'
import { circles } from './law-8-circles'
import { onlyWhatUsesIt, sameAgain } from './law-9-same-again'
import { nothingClamped, outOfRange, refusesWell } from './law-10-refusals'
import { dragsArrive, handlesTrue } from './law-11-handles'
import { steps } from './law-12-steps'
import { continuity } from './law-13-continuity'
import { fairCurves } from './law-14-fair-curves'
import { darts, movedDartsKeepTheirAngle } from './law-16-darts'
import { openings } from './law-17-openings'
import { switchedOff } from './law-18-corrections'
import { tape } from './law-19-tape'
import type { DraftLaw, OrderLaw } from './violation'

/** Laws that judge a finished draft. */
export const draftLaws: readonly DraftLaw[] = [
  outlines,
  seams,
  fits,
  squareCorners,
  smoothJoins,
  cutLines,
  sleeves,
  circles,
  nothingClamped,
  steps,
  fairCurves,
  darts,
  openings,
  tape,
]

/** Laws that draft an order again and again. */
export const orderLaws: readonly OrderLaw[] = [
  sameAgain,
  onlyWhatUsesIt,
  refusesWell,
  outOfRange,
  handlesTrue,
  dragsArrive,
  continuity,
  movedDartsKeepTheirAngle,
  switchedOff,
]
