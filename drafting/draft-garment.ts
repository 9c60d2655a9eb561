import type { Draft, DraftOrder, Problem } from './contract'
import { estimates } from './body'
import { judgeCorrected, withCorrectionsNamed } from './corrected'
import { DraftingError } from './drafting-error'
import { engineVersion } from './engine-version'
import { findGarment } from './garments'
import { checkOrder, type ReadyOrder } from './pen/check-order'
import { Corrections } from './pen/corrections'
import type { Garment } from './pen/garment'
import { Pen } from './pen/pen'
import { writeDimensions } from './pen/write-dimensions'
import { writeSteps } from './pen/write-steps'
import { Values } from './pen/values'
import { applyRemedies } from './remedies/apply'
import { rulesInForce } from './rules-in-force'
import { finish } from './pieces/finish'

/**
 * Drafts a garment.
 *
 * @param order measurements and lengths in mm, angles in degrees.
 * @returns the whole draft; the same order always gives the same draft.
 * @throws DraftingError with every problem found when the order cannot be drafted.
 */
export function draftGarment(order: DraftOrder): Draft {
  const { garment, ready } = readyOrder(order)
  const pen = draw(garment, order, ready)
  const { pieces, seams } = finish(pen)
  judgeCorrected(pen, pieces, seams)
  return {
    engineVersion,
    garment: garment.definition.id,
    pieces,
    seams,
    steps: writeSteps(pen),
    dimensions: writeDimensions(pen),
    fits: pen.fits,
    used: usedMeasurements(garment, ready),
    notions: pen.notions,
    cautions: [...estimateCautions(ready), ...pen.cautions],
  }
}

/** The garment of an order, and the order made ready to be drawn. @throws DraftingError with every problem found */
export function readyOrder(order: DraftOrder): { readonly garment: Garment; readonly ready: ReadyOrder } {
  const garment = findGarment(order)
  const problems: Problem[] = []
  const ready = checkOrder(garment, remedied(garment, order, problems), problems)
  if (!ready || problems.length > 0) throw new DraftingError(problems)
  return { garment, ready }
}

/**
 * An order as its fit remedies leave it: rules and style values raised, marks corrected. It drafts alike.
 * @throws DraftingError when a remedy is at fault
 */
export function withRemedies(order: DraftOrder): DraftOrder {
  const problems: Problem[] = []
  const plain = remedied(findGarment(order), order, problems)
  if (problems.length > 0) throw new DraftingError(problems)
  return plain
}

function remedied(garment: Garment, order: DraftOrder, problems: Problem[]): DraftOrder {
  if (order.remedies === undefined) return order
  const formulaOf = (id: string): string | undefined =>
    rulesInForce(order).find((rule) => rule.id === id)?.formula
  return applyRemedies(garment.definition, order, formulaOf, problems)
}

/** Lets the garment draw itself with a pen. For the engine's own use: what redrafts many times needs only marks. */
export function draw(garment: Garment, order: DraftOrder, ready: ReadyOrder): Pen {
  const values = new Values(ready.rules, ready.measurements, ready.design, estimateSources(ready))
  const pen = new Pen(
    values,
    new Corrections(ready.corrections),
    order.unit ?? 'cm',
    order.tape,
    order.explain !== false,
  )
  try {
    garment.draft(pen)
    pen.settle()
  } catch (error) {
    throw withCorrectionsNamed(error, pen.corrections.active, () =>
      drawsWell(garment, order, { ...ready, corrections: [] }),
    )
  }
  const unknown = pen.corrections.unknown()
  if (unknown.length) throw new DraftingError(unknown)
  return pen
}

function drawsWell(garment: Garment, order: DraftOrder, ready: ReadyOrder): boolean {
  try {
    draw(garment, order, ready)
    return true
  } catch (error) {
    if (error instanceof DraftingError) return false
    throw error
  }
}

/** Estimated measurement → everything on the card that its estimate follows from. */
function estimateSources(ready: ReadyOrder): Record<string, readonly string[]> {
  const sources: Record<string, readonly string[]> = {}
  const collect = (id: string): readonly string[] => {
    if (!ready.estimatedBy[id]) return []
    const uses = estimates[id]?.uses ?? []
    return [...new Set(uses.flatMap((one) => [one, ...collect(one)]))]
  }
  for (const id in ready.estimatedBy) sources[id] = collect(id)
  return sources
}

function usedMeasurements(garment: Garment, ready: ReadyOrder): Draft['used'] {
  const used: Record<string, { mm: number; estimatedBy?: string }> = {}
  const own = ready.rules.own.map(({ id }) => id)
  for (const id of [...garment.definition.needs, ...garment.definition.estimates, ...own]) {
    const estimatedBy = ready.estimatedBy[id]
    if (ready.measurements[id] === undefined) continue
    used[id] = { mm: ready.measurements[id] as number, ...(estimatedBy ? { estimatedBy } : {}) }
  }
  return used
}

function estimateCautions(ready: ReadyOrder): Draft['cautions'] {
  const ids = Object.keys(ready.estimatedBy)
  if (ids.length === 0) return []
  const names = ids.map((id) => estimates[id]?.name ?? id)
  return [
    {
      code: 'estimated',
      message: `Not measured, so estimated: ${names.join('; ')}. Measure them before you cut dear cloth.`,
      fields: ids,
    },
  ]
}
