import type { DesignChoice, DesignValue, GarmentDefinition } from '../contract'
import { choicesOf, offeredChoices } from '../combinations'

type When = DesignValue['when']

const when = (condition: When) => (condition ? { when: condition } : {})

/** A length among the style's values, mm. */
export function length(
  id: string,
  name: string,
  part: string,
  range: { default: number; min: number; max: number },
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'length', ...range, ...when(condition) }
}

/** An angle among the style's values, degrees. */
export function angle(
  id: string,
  name: string,
  part: string,
  range: { default: number; min: number; max: number },
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'angle', ...range, ...when(condition) }
}

/** A share of a whole, such as the share of a circle. */
export function share(
  id: string,
  name: string,
  part: string,
  range: { default: number; min: number; max: number },
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'share', ...range, ...when(condition) }
}

/** A whole number of things. */
export function count(
  id: string,
  name: string,
  part: string,
  range: { default: number; min: number; max: number },
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'count', ...range, ...when(condition) }
}

/** One of several named ways. The first is the default. */
export function choice(
  id: string,
  name: string,
  part: string,
  choices: readonly [string, ...string[]],
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'choice', default: choices[0], choices, ...when(condition) }
}

/** Something the garment has or has not. */
export function yesNo(
  id: string,
  name: string,
  part: string,
  byDefault: boolean,
  condition?: When,
): DesignValue {
  return { id, name, part, kind: 'yes-no', default: byDefault, ...when(condition) }
}

type Chosen = (id: string) => DesignChoice | undefined
type Offering = Pick<GarmentDefinition, 'id' | 'design'>

/** Whether what a value hangs on is chosen, and hangs on what is chosen itself. */
export function isDrawn(value: DesignValue, chosen: Chosen, garment: Offering): boolean {
  const { when: condition } = value
  if (!condition) return true
  const other = chosen(condition.id)
  if (other === undefined || !condition.is.includes(other)) return false
  const above = garment.design.find((one) => one.id === condition.id)
  return !above || isDrawn(above, chosen, garment)
}

/** Whether a value is offered with the other choices as they stand: it is drawn, and they leave it more than one choice. */
export function isOffered(value: DesignValue, chosen: Chosen, garment: Offering): boolean {
  const left = offeredChoices(garment.id, value, chosen).length
  return isDrawn(value, chosen, garment) && (left > 1 || choicesOf(value).length === left)
}
