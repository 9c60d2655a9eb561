import type { Draft, GarmentDefinition, Handle } from '@/drafting/contract'

/** A mark that no drag moves, with what a drafter would say about it. */
export interface FixedPoint {
  /** 'front/shoulderEnd' */
  readonly id: string
  readonly piece: string
  readonly mark: string
  /** 'Point C of Front' */
  readonly name: string
  readonly why: string
}

/** So many names are said before the rest is counted. */
const said = 4

/**
 * Every mark that is not to be dragged: how it came about, why it stays, and what does move it.
 * @param draft with the words of its steps
 * @param names of measurements, by id
 */
export function fixedPoints(
  draft: Draft,
  handles: readonly Handle[],
  garment: GarmentDefinition,
  names: ReadonlyMap<string, string>,
): readonly FixedPoint[] {
  const dragged = new Set(handles.map(({ piece, mark }) => `${piece}/${mark}`))
  return draft.pieces.flatMap((piece) =>
    piece.marks
      .map((mark) => ({ mark, id: `${piece.id}/${mark.id}` }))
      .filter(({ id }) => !dragged.has(id))
      .map(({ mark, id }) => {
        const step = draft.steps.find((each) => each.piece === piece.id && each.marks.includes(mark.id))
        return {
          id,
          piece: piece.id,
          mark: mark.id,
          name: `Point ${mark.letter ?? mark.id} of ${piece.name}`,
          why: `${step?.text ? `${step.text}. ` : ''}${whyWords(step?.uses ?? [], garment, names)}`,
        }
      }),
  )
}

function whyWords(
  uses: readonly string[],
  garment: GarmentDefinition,
  names: ReadonlyMap<string, string>,
): string {
  const style = named(uses, garment.design)
  const body = uses.flatMap((id) => names.get(id) ?? [])
  const rules = named(uses, garment.rules).map((name) => `the rule “${name}”`)
  if (style.length + body.length + rules.length === 0)
    return 'It cannot be dragged: the piece is drawn from here.'
  if (style.length === 0)
    return `It cannot be dragged: it follows from the body. ${movers([...body, ...rules])} it.`
  return `It cannot be dragged on its own: it follows other lines. ${movers([...style, ...body, ...rules])} it.`
}

const named = (ids: readonly string[], of: readonly { readonly id: string; readonly name: string }[]) =>
  of.filter(({ id }) => ids.includes(id)).map(({ name }) => name)

/** 'Bust, Bust ease and 3 more move' */
function movers(all: readonly string[]): string {
  if (all.length === 1) return `${all[0]} moves`
  const rest = all.length - said
  const first = all.slice(0, rest > 0 ? said : -1)
  return `${first.join(', ')} and ${rest > 0 ? `${rest} more` : all.at(-1)} move`
}
