import { DraftingError, draftGarment, parseLength } from '@/drafting'
import type { Draft } from '@/drafting/contract'
import { arrange, drawing, toSvg, typesetFractions } from '@/drafting/drawing'

/** What the top of the page shows for one bust girth. */
export interface HeroDraft {
  readonly svg: string
  readonly sums: readonly { readonly text: string; readonly sum: string }[]
}

const inch = 25.4

/** Two invented bodies; what is not asked for is taken between them, so that the dress stays a dress at any size. */
const small = {
  bust: 36,
  waist: 29,
  hip: 38.5,
  neckBase: 14.5,
  shoulderLength: 5,
  acrossShoulders: 15.5,
  acrossBack: 13.75,
  acrossFront: 12.75,
  napeToWaist: 16,
  frontWaistLength: 17.25,
  waistToHip: 8,
  upperArm: 11.25,
  armLength: 23,
  height: 65,
  head: 22,
}
const large = {
  bust: 48,
  waist: 42.5,
  hip: 50.5,
  neckBase: 16.25,
  shoulderLength: 5.25,
  acrossShoulders: 16.75,
  acrossBack: 16.25,
  acrossFront: 15.25,
  napeToWaist: 16.5,
  frontWaistLength: 19,
  waistToHip: 8.25,
  upperArm: 15.25,
  armLength: 23,
  height: 65,
  head: 22.5,
}

/** mm; outside it the two bodies say nothing. */
export const bustRange = { min: 30 * inch, max: 54 * inch } as const

const shownSteps = ['front.leastLevel', 'front.underarm']
const shownLengths = ['front.armholeLevel-underarm', 'front.neckLevel-centreNeck']

function bodyFor(bust: number): Record<string, number> {
  const share = (bust / inch - small.bust) / (large.bust - small.bust)
  const between = Object.entries(small).map(([id, value]) => [
    id,
    Math.round((value + (large[id as keyof typeof large] - value) * share) * 8) * (inch / 8),
  ])
  return { ...Object.fromEntries(between), bust }
}

/** The whole dress for a bust girth in inches. @throws DraftingError */
export function exampleDraft(bust: number): Draft {
  const design = { bustEase: 3 * inch, length: 42 * inch }
  return draftGarment({ garment: 'flared-dress', measurements: bodyFor(bust * inch), design, unit: 'in' })
}

/** Drafts front and back of a flared dress for a bust girth, mm. @throws DraftingError */
export function heroDraft(bust: number): HeroDraft {
  const draft = exampleDraft(bust / inch)
  const shown: Draft = {
    ...draft,
    pieces: draft.pieces.filter((piece) => piece.id === 'front' || piece.id === 'back'),
    dimensions: draft.dimensions.filter((dimension) => shownLengths.includes(dimension.id)),
  }
  return { svg: heroSvg(shown), sums: sumsOf(draft) }
}

function heroSvg(draft: Draft): string {
  const layers = [
    'fill',
    'construction',
    'inner',
    'grain',
    'stitch',
    'fold',
    'cut',
    'notch',
    'dimension',
  ] as const
  const places = arrange(draft, { gap: 60 })
  const drawn = drawing(draft, { layers, places, unit: 'in', textScale: 4.4 })
  // Words that would be too small to read here say nothing.
  const items = drawn.items.filter((item) => item.style !== 'label-small')
  return toSvg(
    { ...drawn, items },
    {
      title: 'Front and back of a flared dress, drafted from the bust girth beside it',
      for: 'screen',
      margin: 24,
      dye: (dye) => `var(--${dye})`,
    },
  )
}

function sumsOf(draft: Draft): HeroDraft['sums'] {
  return draft.steps.flatMap((step) =>
    shownSteps.includes(step.id) && step.arithmetic
      ? [{ text: step.text, sum: `${typesetFractions(step.arithmetic)} in` }]
      : [],
  )
}

/** Reads what was typed and drafts it, or says what is wrong with it. */
export function heroFor(typed: string): HeroDraft | { readonly problem: string } {
  try {
    const bust = parseLength(typed, 'in')
    if (bust < bustRange.min || bust > bustRange.max) {
      return { problem: 'This drawing goes from 30 to 54 inches: try 36 1/2.' }
    }
    return heroDraft(bust)
  } catch (error) {
    if (error instanceof DraftingError) return { problem: error.message }
    throw error
  }
}
