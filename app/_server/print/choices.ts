import 'server-only'
import * as z from 'zod'
import { papers } from '@/drafting/drawing'
import type { Orientation, PaperId } from '@/drafting/drawing'

const paperIds = papers.map(({ id }) => id) as [PaperId, ...PaperId[]]
const orientations = ['fewest', 'portrait', 'landscape'] as const satisfies readonly Orientation[]

/** How a pattern is wanted on paper, as it stands in an address. */
export const printChoices = {
  paper: z
    .enum(paperIds, `Choose one of these papers: ${papers.map(({ id }) => id).join(', ')}.`)
    .default('a4'),
  orientation: z
    .enum(orientations, 'Choose portrait, landscape, or fewest for whichever takes fewest sheets.')
    .default('fewest'),
  allowances: z
    .enum(['yes', 'no'], 'Say yes for a pattern with allowances, no for a nett one.')
    .default('yes'),
}

/** The choices of a one-page drawing, which has no paper. */
export const drawingChoices = { allowances: printChoices.allowances }
