import type { Draft, Fit } from '@/drafting/contract'
import { chordsOf, endOfPath, far, lengthOfPath, startOfPath } from './curves'
import { garmentOf, numberOf } from './formulas'
import { Chain, closedChain, ringOf, stitchPath } from './outline'
import { Findings, type DraftLaw } from './violation'

/** Which body measurement and which ease each fit is about. */
const about: Readonly<Record<string, { readonly body: string; readonly ease?: string }>> = {
  bust: { body: 'bust', ease: 'bustEase' },
  biceps: { body: 'upperArm', ease: 'sleeveEase' },
  neck: { body: 'neckBase' },
  armhole: { body: 'upperArm' },
}
const aboutBodice: typeof about = { ...about, waist: { body: 'waist', ease: 'waistEase' } }
const aboutSkirt: typeof about = {
  waist: { body: 'waist', ease: 'waistEase' },
  hip: { body: 'hip', ease: 'hipEase' },
}

/** A fit that is equal is at least as well. */
const strength: Readonly<Record<Fit['relation'], number>> = { shown: 0, 'at-least': 1, equal: 2 }

/** What each garment's fits must promise, by their ids. */
const promised: Readonly<Record<string, Readonly<Record<string, Fit['relation']>>>> = {
  'flared-dress': {
    bust: 'equal',
    waist: 'at-least',
    hip: 'at-least',
    biceps: 'at-least',
    armhole: 'at-least',
  },
  'circle-skirt': { waist: 'equal' },
  'straight-skirt': { waist: 'equal', hip: 'at-least' },
  'a-line-skirt': { waist: 'equal', hip: 'at-least' },
  'gored-skirt': { waist: 'equal', hip: 'at-least' },
  'gathered-skirt': { waist: 'equal' },
  kaftan: { bust: 'at-least', hip: 'at-least', biceps: 'at-least' },
  peplum: { waist: 'equal' },
  'waist-seam-dress': { waist: 'equal', biceps: 'at-least', armhole: 'at-least' },
  'shift-dress': { waist: 'at-least', hip: 'at-least', biceps: 'at-least' },
  bodice: { bust: 'equal', waist: 'equal', biceps: 'at-least', armhole: 'at-least' },
}

/** Each fit is what is drawn, ends on the stitch line and keeps its promise to the body. */
export const fits: DraftLaw = (draft, order, engine) => {
  const found = new Findings(3)
  const lines = new Map<string, Chain>()
  const garment = garmentOf(order, engine.garments)
  const meanings =
    order.garment.endsWith('-skirt') || order.garment === 'peplum'
      ? aboutSkirt
      : order.garment === 'bodice' || order.garment === 'waist-seam-dress'
        ? aboutBodice
        : about
  const ids = draft.fits.map((fit) => fit.id)
  for (const id of new Set(ids)) {
    if (ids.indexOf(id) !== ids.lastIndexOf(id)) found.add(id, 'is measured twice')
  }
  for (const fit of draft.fits) {
    measured(found, draft, fit, lines, order.corrections?.some((one) => !one.off) ?? false)
    const meaning = meanings[fit.id]
    const asked = (name: string | undefined): number | undefined =>
      name === undefined ? undefined : numberOf(name, order, garment, draft.used)
    const body = asked(meaning?.body)
    if (body !== undefined)
      found.atMost(fit.id, 'body against the card', Math.abs((fit.body ?? NaN) - body), 1e-6)
    // Round the arm a sleeve in one with the body has an ease of its own.
    const inOne =
      fit.id === 'biceps' && draft.pieces.some(({ edges }) => edges.some(({ id }) => id === 'mouth'))
    const ease = asked(inOne ? 'kimonoEase' : meaning?.ease)
    if (ease !== undefined && !order.tape) {
      found.atMost(fit.id, 'ease against the style', Math.abs(fit.ease - ease), 1e-6)
    }
    promise(found, fit)
  }
  // What the rules promise is promised, unless somebody changed them or the marks.
  if (order.rules || order.corrections?.some((one) => !one.off)) return found.all
  for (const [id, relation] of Object.entries(promised[order.garment] ?? {})) {
    const fit = draft.fits.find((one) => one.id === id)
    if (fit && strength[fit.relation] < strength[relation])
      found.add(id, `is only “${fit.relation}”, “${relation}” is due`)
  }
  return found.all
}

function measured(
  found: Findings,
  draft: Draft,
  fit: Fit,
  lines: Map<string, Chain>,
  corrected: boolean,
): void {
  let sum = 0
  for (const { piece: id, path, times } of fit.across) {
    sum += times * lengthOfPath(path)
    const piece = draft.pieces.find((one) => one.id === id)
    if (!piece) {
      found.add(fit.id, `runs across ${id}, which is not drawn`)
      continue
    }
    let line = lines.get(id)
    if (!line) lines.set(id, (line = closedChain(ringOf(stitchPath(piece), 0.0005))))
    // A lapped front runs on beyond its centre, from which a girth is measured.
    const lapped = piece.edges.some((one) => one.id === 'overlap-neck')
    const centre = piece.lines.find((one) => lapped && one.id === 'centre-front')
    // A girth leaves out what a dart inside the piece takes up: it ends on both sides of its mouth.
    const mouths = piece.darts.flatMap((dart) =>
      dart.edges ? [] : dart.legs.flatMap((leg) => chordsOf(leg)),
    )
    for (const end of [startOfPath(path), endOfPath(path)]) {
      if (mouths.some((point) => far(point, end) < 0.01)) continue
      const onCentre = centre ? new Chain(chordsOf(centre.path)).gap(end) : Infinity
      found.atMost(`${fit.id} on ${id}`, 'end off the stitch line', Math.min(line.gap(end), onCentre), 0.01)
    }
    // A panel that is taken in on one side only does not lie level any more.
    if (!corrected && draft.garment === 'circle-skirt' && ['waist', 'hip', 'hem'].includes(fit.id))
      sagging(found, fit, path)
  }
  found.atMost(fit.id, 'length as stated against measured', Math.abs(fit.length - sum), 0.01)
}

/** On a circle skirt a level is an arc about the point of the circle, not a horizontal. */
function sagging(found: Findings, fit: Fit, path: Parameters<typeof chordsOf>[0]): void {
  const heights = chordsOf(path).map((point) => point.y)
  const ends = Math.abs((heights[0] as number) - (heights[heights.length - 1] as number))
  const sag = Math.max(...heights) - (heights[0] as number)
  if (!(ends < 0.05 && sag > 0.5)) found.add(fit.id, 'is no arc about the point of the circle')
}

function promise(found: Findings, fit: Fit): void {
  if (fit.relation === 'shown') return
  if (fit.body === undefined) return found.add(fit.id, 'promises something without a body')
  const wanted = fit.body + fit.ease
  if (fit.relation === 'equal') found.atMost(fit.id, 'off body and ease', Math.abs(fit.length - wanted), 1)
  else found.atMost(fit.id, 'short of body and ease', wanted - fit.length, 1e-6)
}
