import type { DesignChoice, DesignValue } from '../contract'

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

/** Whether a value is offered with the other choices as they stand. */
export function isOffered(value: DesignValue, chosen: (id: string) => DesignChoice | undefined): boolean {
  if (!value.when) return true
  const other = chosen(value.when.id)
  return other !== undefined && value.when.is.includes(other)
}
