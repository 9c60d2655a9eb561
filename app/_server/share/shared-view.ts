import 'server-only'
import type { OpenedShare } from '@/db/access/shares'
import { draftGarment } from '@/drafting'
import type { Draft, DraftOrder, Unit } from '@/drafting/contract'
import { arrange, cuttingWords, drawing, layOut, paperOf, toSvg, typesetFractions } from '@/drafting/drawing'
import { formatLength } from '@/drafting/lengths'
import { piecesById, runsLength } from '@/drafting/pieces/runs'
import { seamAgrees } from '@/drafting/pieces/seam-agrees'
import { garmentName } from '../print/pattern-of'
import { sharedDrawing } from './shared-drawing'

/** The same words in either unit: the visitor chooses, the server is not asked again. */
export type InUnits = Readonly<Record<Unit, string>>

export interface SharedCheck {
  readonly name: string
  readonly good: boolean
  readonly words: InUnits
}

export interface SharedStep {
  readonly piece: string
  readonly text: string
  readonly sum: InUnits | null
}

/** All that a visitor's page is given. Neither the order nor a measurement is in it; sums are in it only for a lesson. */
export interface SharedView {
  readonly name: string
  readonly garment: string
  readonly workroom: string
  /** When the version was saved, ISO 8601: the visitor's page says it in the visitor's own time zone. */
  readonly savedAt: string
  /** The unit that the drafter works in. */
  readonly unit: Unit
  /** The drawing with its lengths in both units, as SVG text. */
  readonly svg: string
  readonly pieces: readonly { readonly name: string; readonly cut: readonly string[] }[]
  readonly tags: readonly { readonly piece: string; readonly label: string; readonly length: InUnits }[]
  readonly checks: readonly SharedCheck[]
  /** Sheets that the pattern takes, with allowances, the way that needs fewest. */
  readonly sheets: { readonly a4: number; readonly letter: number }
  /** Of a lesson. */
  readonly steps: readonly SharedStep[] | null
  /** Pieces that the engine would draw otherwise today: what is shown and printed is the drawing as it was first shared. */
  readonly otherwise: readonly string[]
}

/** Texts must be read on a screen on which the whole sheet shows. */
const textScale = 3.2

const both = (mm: number): InUnits => ({
  in: typesetFractions(formatLength(mm, 'in')),
  cm: formatLength(mm, 'cm'),
})

/** What a link shows: the draft's newest version. @throws DraftingError */
export async function sharedView(share: OpenedShare): Promise<SharedView> {
  const { draft, otherwise } = await sharedDrawing(share)
  const garment = garmentName(share.order.garment)
  return {
    name: share.draftName,
    garment,
    workroom: share.workroomName,
    savedAt: share.savedAt,
    unit: share.order.unit ?? 'cm',
    svg: sharedSvg(draft, `${share.draftName}: ${garment.toLowerCase()}`),
    pieces: draft.pieces.map(({ name, cut }) => ({ name, cut: cut.map(cuttingWords) })),
    tags: tagsOf(draft),
    checks: checksOf(draft),
    sheets: { a4: sheets(draft, 'a4'), letter: sheets(draft, 'letter') },
    steps: share.scope === 'lesson' ? stepsOf(share.order) : null,
    otherwise: [...new Set(otherwise.map(({ piece }) => piece))],
  }
}

function sharedSvg(draft: Draft, title: string): string {
  const places = arrange(draft)
  const lengths = (unit: Unit) => drawing(draft, { layers: ['dimension'], places, unit, textScale })
  return toSvg(drawing(draft, { places, textScale }), {
    title,
    description: 'The pieces of the pattern, to scale with each other.',
    for: 'screen',
    margin: 30,
    dye: (dye) => `var(--${dye})`,
    units: { in: lengths('in'), cm: lengths('cm') },
  })
}

function nameOf(draft: Draft, id: string): string {
  return draft.pieces.find((piece) => piece.id === id)?.name ?? id
}

function tagsOf(draft: Draft): SharedView['tags'] {
  return draft.dimensions.map(({ piece, label, length }) => ({
    piece: nameOf(draft, piece),
    label,
    length: both(length),
  }))
}

function checksOf(draft: Draft): readonly SharedCheck[] {
  const pieces = piecesById(draft.pieces)
  return draft.seams.map((seam) => {
    const [a, b] = [seam.a, seam.b].map((runs) => both(runsLength(runs, pieces)))
    const ease = both(seam.ease)
    const eased = seam.join === 'gathered' ? 'gathered' : 'eased'
    const say = (unit: Unit) =>
      `${a?.[unit]} on ${b?.[unit]}${seam.ease ? `, ${ease[unit]} ${eased} in` : ''}`
    return { name: seam.name, good: seamAgrees(seam), words: { in: say('in'), cm: say('cm') } }
  })
}

function stepsOf(order: DraftOrder): readonly SharedStep[] {
  const inCentimetres = draftGarment({ ...order, unit: 'cm' })
  const inInches = draftGarment({ ...order, unit: 'in' })
  return inCentimetres.steps.map((step, index) => {
    const inches = inInches.steps[index]?.arithmetic
    const sum =
      step.arithmetic && inches
        ? { cm: typesetFractions(step.arithmetic), in: typesetFractions(inches) }
        : null
    return { piece: nameOf(inCentimetres, step.piece), text: step.text, sum }
  })
}

function sheets(draft: Draft, paper: 'a4' | 'letter'): number {
  const { tiling } = layOut({ draft, paper: paperOf(paper), orientation: 'fewest', allowances: true })
  return tiling.pages.filter((page) => !page.blank).length
}
