import 'server-only'
import * as z from 'zod'
import { invalid } from '@/db/access-error'
import type { Draft } from '@/drafting/contract'
import { correctable, paperOf, papers, printScales, rollWidths } from '@/drafting/drawing'
import type { LayOutRequest, PaperId, PrintScale } from '@/drafting/drawing'

const paperIds: readonly PaperId[] = [...papers.map(({ id }) => id), 'roll']
const scales = Object.keys(printScales) as [PrintScale, ...PrintScale[]]

/** A number in an address, in millimetres. */
const millimetres = (least: number, most: number, what: string) =>
  z
    .string()
    .regex(/^\d{1,5}(\.\d{1,3})?$/, `${what} is a number of millimetres, such as ${least}.`)
    .transform(Number)
    .refine((value) => value >= least && value <= most, `${what} is ${least} to ${most} mm.`)

const measured = (way: string) =>
  millimetres(
    correctable.least,
    correctable.most,
    `What 100 mm measures ${way} the paper on your printer, when it prints at 100 %,`,
  ).default(100)

/** How a pattern is wanted on paper, as it stands in an address. */
export const printChoices = {
  paper: z.enum(paperIds, `Choose one of these papers: ${paperIds.join(', ')}.`).default('a4'),
  roll: millimetres(rollWidths.least, rollWidths.most, 'The width of a roll').default(rollWidths.usual),
  orientation: z
    .enum(
      ['fewest', 'portrait', 'landscape'],
      'Choose portrait, landscape, or fewest for whichever takes fewest sheets.',
    )
    .default('fewest'),
  allowances: z
    .enum(['yes', 'no'], 'Say yes for a pattern with allowances, no for a nett one.')
    .default('yes'),
  scale: z.enum(scales, `Choose one of these sizes: ${scales.join(', ')}.`).default('full'),
  join: z
    .enum(['trim', 'butt'], 'Choose trim (one sheet over the other) or butt (edge to edge).')
    .default('trim'),
  margin: millimetres(10, 25, 'The edge that stays free').default(10),
  across: measured('across'),
  along: measured('along'),
  ink: z.enum(['colour', 'black'], 'Choose colour or black.').default('colour'),
  lines: z.enum(['fine', 'bold'], 'Choose fine or bold.').default('fine'),
  pieces: z
    .string()
    .max(2000)
    .regex(/^[\w-]+(,[\w-]+)*$/, 'Name the pieces by their ids, with commas between.')
    .transform((text) => text.split(','))
    .optional(),
}

/** The choices of a one-page drawing, which has no paper. */
export const drawingChoices = { allowances: printChoices.allowances }

/** Of a version that was printed or shared before: as it was then, or as the engine draws it today. */
export const whichDrawing = z.enum(['kept', 'today'], 'Say kept or today.').default('kept')

export type PrintQuery = z.output<z.ZodObject<typeof printChoices>>

/** The choices as the layout takes them. @throws AccessError invalid when a piece is wanted that the draft has not */
export function layOutOf(draft: Draft, query: PrintQuery): Omit<LayOutRequest, 'title'> {
  const unknown = query.pieces?.find((id) => !draft.pieces.some((piece) => piece.id === id))
  if (unknown !== undefined) {
    const known = draft.pieces.map(({ id }) => id).join(', ')
    throw invalid('pieces', `This draft has no piece "${unknown}". Its pieces are ${known}.`)
  }
  return {
    draft,
    paper: paperOf(query.paper, query.roll),
    orientation: query.orientation,
    allowances: query.allowances === 'yes',
    scale: query.scale,
    join: query.join,
    margin: query.margin,
    measured: { short: query.across, long: query.along },
    pieces: query.pieces,
  }
}
