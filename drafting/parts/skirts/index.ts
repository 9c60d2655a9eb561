import type { DesignValue, RuleDefinition } from '../../contract'
import { length } from '../../pen/design'
import type { Garment } from '../../pen/garment'
import { aLine } from './a-line'
import { belowDartFound, belowDartRules } from './below-darts'
import { circle } from './circle'
import { gathered } from './gathered'
import { gored } from './gored'
import type { Skirt } from './skirt'
import { straight } from './straight'

/** The skirts that a bodice can have, by their names in the style. */
export const skirts: Readonly<Record<string, Skirt>> = {
  'A-line': aLine,
  straight,
  gored,
  gathered,
  circle,
}

/** What a bodice states itself, and what only a skirt worn by itself has. */
const wornAlone = new Set([
  'opening',
  'zipLength',
  'waistband',
  'waistbandDepth',
  'underlap',
  'waistbandAllowance',
  'waistEasedIn',
  'waistbandLength',
  'waistbandFold',
  'panels',
  'panelAngle',
  'radius',
  'hemRadius',
  'waistEase',
  'waistAllowance',
  'sideAllowance',
  'centreBackAllowance',
])

/** Two values of one id as one: the range that suits both, and the default of the first as far as it lies in it. */
function together(one: DesignValue, other: DesignValue): DesignValue {
  if (one.min === undefined || one.max === undefined || typeof one.default !== 'number') return one
  const min = Math.max(one.min, other.min ?? one.min)
  const max = Math.min(one.max, other.max ?? one.max)
  return { ...one, min, max, default: Math.min(max, Math.max(min, one.default)) }
}

/** The style values of all skirts below a bodice, each offered with the skirts that have it. */
function skirtValues(): DesignValue[] {
  const names = Object.keys(skirts)
  const all = names.flatMap((name) => (skirts[name] as Skirt).design.map((value) => ({ name, value })))
  const ids = [...new Set(all.map(({ value }) => value.id))].filter((id) => !wornAlone.has(id))
  return ids.map((id) => {
    const own = all.filter(({ value }) => value.id === id)
    const { when, ...value } = own.map((one) => one.value).reduce(together)
    const condition = when && !wornAlone.has(when.id) ? when : undefined
    if (condition) return { ...value, when: condition }
    return own.length === names.length
      ? value
      : { ...value, when: { id: 'skirt', is: own.map(({ name }) => name) } }
  })
}

export const dressSkirtDesign: readonly DesignValue[] = [
  ...skirtValues(),
  length('zipBelowWaist', 'Zip below the waist', 'opening', { default: 180, min: 150, max: 250 }),
]

/** The rules of all skirts below a bodice. Throws where two skirts mean different things by one name. */
function rulesOfSkirts(): RuleDefinition[] {
  const rules = new Map<string, RuleDefinition>()
  for (const rule of Object.values(skirts).flatMap((skirt) => skirt.rules)) {
    if (wornAlone.has(rule.id)) continue
    const known = rules.get(rule.id)
    const formula = rule.formula.replaceAll('zipLength', 'zipBelowWaist')
    if (known && known.formula !== formula) throw new Error(`Two skirts state “${rule.id}” differently.`)
    rules.set(rule.id, known ?? { ...rule, formula })
  }
  return [...rules.values()]
}

export const dressSkirtRules: readonly RuleDefinition[] = [...rulesOfSkirts(), ...belowDartRules]

export const dressSkirtFound: Garment['found'] = Object.assign(
  { ...belowDartFound },
  ...Object.values(skirts).map((skirt) => skirt.found),
) as Garment['found']
