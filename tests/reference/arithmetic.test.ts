import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { distance, point, rotate } from '@/drafting/geometry/point'
import { checkFormulaKinds, evaluateFormula, explainFormula, parseFormula, type Kind } from '@/drafting/rules'
import { evaluateArithmetic } from '../support/arithmetic'

interface Example {
  readonly id: string
  readonly topic: string
  readonly unit: 'in' | 'cm'
  readonly inputs: Readonly<Record<string, number>>
  readonly outputs: Readonly<Record<string, number>>
  readonly tolerance: number
  readonly source: string
}

const examples = JSON.parse(
  readFileSync(new URL('data/worked-examples.json', import.meta.url), 'utf8'),
) as readonly Example[]

/** Half of the last decimal that a figure was printed with. */
function printedTo(figure: number): number {
  return 0.5 / 10 ** (String(figure).split('.')[1] ?? '').length
}

/** Inputs that are no lengths. */
const bare = new Set(['fraction', 'pi', 'gores', 'stacked', 'shrink', 'n'])

const circle = {
  radius: 'waist / (2 × pi × fraction)',
  outer: 'waist / (2 × pi × fraction) + length',
  hem_sweep: 'waist + 2 × pi × fraction × length',
  girth_at_20: 'waist + 2 × pi × fraction × 20 cm',
}

/** The rules of each source, as formulas. A figure of an example that is not here stands in its own test below. */
const rules: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  'circle-quarter-70': circle,
  'circle-half-70': circle,
  'circle-three-quarter-70': circle,
  'circle-full-70': circle,
  'circle-full-88': circle,
  'circle-one-and-a-half-88': circle,
  'circle-110-pub': {
    // The tutorial reckons with 3.14: 0.1 mm off the true radius, and so printed.
    radius_full: 'waist / (2 × 3.14)',
    radius_half_plain: 'waist / 3.14',
    exact_full: 'waist / (2 × pi)',
  },
  'flounce-baldt': {
    radius_top: 'width_top × depth / (width_bottom − width_top)',
    outer: 'width_top × depth / (width_bottom − width_top) + depth',
    angle_rad: '(width_bottom − width_top) / depth',
    angle_deg: '(width_bottom − width_top) / depth × 180° / pi',
  },
  'gore-bennett': {
    waist_per_gore: 'waist / gores',
    hip_per_gore: 'hip / gores',
    // The book prints 17 1/2 in for the other gores: 81 − 10 shared by four is 17 3/4, a slip of its arithmetic.
    other_gore_hem: '(hem_yd × 36 − front_gore_hem) / 4',
    // 39 at the side, 39 1/2 at the back: each gore towards the back rises by the half inch between them.
    back_rise_per_gore_step: 'back − side',
  },
  'skirt-wikieducator': {
    width_1_2: 'hips / 2 + 2.5 cm',
    back_hip_5_6: 'hips / 4 + 2 cm',
    back_waist_1_7: 'waist / 4 + 3.2 cm',
    front_waist_2_10: 'waist / 4 + 2 cm',
    side_raise: '1 cm',
    back_dart_width: '2 cm',
    back_dart_length: '12 cm',
    front_dart_width: '2 cm',
    front_dart_length: '10 cm',
    // Both halves, the darts closed. The handout takes no ease for the waist: 2.4 cm are what its figures leave.
    finished_waist: '2 × (waist / 2 + 5.2 cm − 4 cm)',
    finished_hip: '2 × (hips / 2 + 2.5 cm)',
  },
  // Divisions of half the size. What the lesson adds to them without saying from what (AD, KL, the back width) is left out.
  'waist-rosenfeld-142': {
    AB: 'depth',
    AC: 'waist_len',
    BG: 'size / 2 × 2 / 3',
    BH: 'size / 2 / 3',
    AK: 'size / 2 / 6',
    GF: 'size / 2 / 6',
  },
  'vani-34': {
    scye_depth: 'chest / 8 + 2 1/2 in',
    chest_width: 'chest / 4 + 1 1/2 in',
    half_shoulder: 'shoulder / 2 + 1/4 in',
    neck_width: 'chest / 12 + 1/4 in',
    front_neck_depth: 'chest / 8',
    hip_width: 'seat / 4 + 1 1/2 in',
    back_length: 'waist_len + 1/2 in',
  },
  'baldt-skirt': { half_hip: 'hip / 2', half_hem: 'hem / 2' },
  'ingalls-neck': {
    front_neck_drop: 'neck / 5 + 1/4 in',
    half_front: 'front_width / 2',
    bust_line: '(bust − back_width) / 2',
  },
  'burton-sleeve': {
    cap_height: 'armhole / 4',
    half_width_on_fold: '(armhole + 1 in) / 2',
    full_width: 'armhole + 1 in',
    MN: 'armhole / 5',
    MO: 'armhole × 2 / 5',
  },
  'burton-neck': {
    width: '2 in',
    depth: '2 in + (neck − 12 in) / 1/2 in × 1/8 in',
    shoulder_drop: '1 1/2 in',
  },
  'sleeve-third': { cap_height: 'armhole / 3' },
  'bunka-old': { frame_width: 'bust / 2 + 5 cm', bust_line_depth: 'bust / 6 + 7 cm' },
  shrink: { buy: 'required / (1 − shrink)' },
  plaid: { extra: 'repeat × stacked' },
}

const perUnit = { in: 25.4, cm: 10 } as const

function kindOf(output: string): Kind {
  return output === 'angle_rad' ? 'number' : output === 'angle_deg' ? 'angle' : 'length'
}

const cases = examples.flatMap((example) =>
  Object.entries(rules[example.id] ?? {}).map(([output, formula]) => ({ ...example, output, formula })),
)

describe('printed rules, worked through the formula engine', () => {
  it.each(cases)(
    '$id: $output = $formula',
    ({ unit, inputs, outputs, output, formula, tolerance, source }) => {
      const entries = Object.entries(inputs)
      const values = Object.fromEntries(
        entries.map(([id, value]) => [id, bare.has(id) ? value : value * perUnit[unit]]),
      )
      const kinds = Object.fromEntries(
        entries.map(([id]): [string, Kind] => [id, bare.has(id) ? 'number' : 'length']),
      )
      const wanted = kindOf(output)
      const read = parseFormula(formula)
      expect(checkFormulaKinds(read, kinds, wanted)).toEqual([])
      const result = evaluateFormula(read, values)
      const inUnit = wanted === 'length' ? result / perUnit[unit] : result
      const printed = outputs[output] ?? NaN
      const allowed = Math.max(tolerance, printedTo(printed))
      expect(Math.abs(inUnit - printed), source).toBeLessThanOrEqual(allowed)
      const shown = evaluateArithmetic(
        explainFormula(read, values, kinds, unit, result, { measures: wanted }),
      )
      expect(Math.abs(shown.left - inUnit)).toBeLessThan(0.01)
    },
  )

  it('leave no printed figure unchecked', () => {
    const elsewhere = ['dart-chord', 'dart-rotate', 'slash-spread', 'repeat']
    for (const { id, outputs } of examples) {
      if (elsewhere.includes(id)) continue
      const areas = Object.keys(outputs).filter((output) => output !== 'area_cm2')
      expect(Object.keys(rules[id] ?? {}).sort(), id).toEqual(areas.sort())
    }
  })
})

function example(id: string): Example {
  const found = examples.find((one) => one.id === id)
  if (!found) throw new Error(`No example ${id}`)
  return found
}

/** How far apart the ends of two legs lie that open by an angle. */
function opening(leg: number, degrees: number): number {
  return distance(point(leg, 0), rotate(point(leg, 0), degrees))
}

describe('printed angles and areas', () => {
  it.each(Object.keys(rules).filter((id) => id.startsWith('circle-') && id !== 'circle-110-pub'))(
    '%s: cloth area',
    (id) => {
      const { inputs, outputs } = example(id)
      const { waist = 0, fraction = 0, length = 0 } = inputs
      const area = evaluateFormula(parseFormula('(waist + pi × fraction × length) × length'), {
        waist,
        fraction,
        length,
      })
      // Printed to four figures.
      expect(Math.abs(area / (outputs.area_cm2 ?? 0) - 1)).toBeLessThan(0.0005)
    },
  )

  it('a dart 2 cm wide on legs of 13 cm opens by its printed angle', () => {
    const { inputs, outputs, tolerance } = example('dart-chord')
    expect(Math.abs(opening(inputs.leg ?? 0, outputs.angle_deg ?? 0) - (inputs.intake ?? 0))).toBeLessThan(
      tolerance,
    )
  })

  it('a moved dart keeps its angle', () => {
    const { inputs, outputs, tolerance } = example('dart-rotate')
    const { angle_deg = 0, new_intake = 0 } = outputs
    expect(Math.abs(opening(inputs.leg ?? 0, angle_deg) - (inputs.intake ?? 0))).toBeLessThan(tolerance)
    expect(Math.abs(opening(inputs.new_leg ?? 0, angle_deg) - new_intake)).toBeLessThan(tolerance)
  })

  it('slashes hinged at the head spread the hem by their chords', () => {
    const { inputs, outputs, tolerance } = example('slash-spread')
    const { hem = 0, length = 0, n = 0, spread_each = 0 } = inputs
    const chord = opening(length, outputs.wedge_deg ?? 0)
    expect(Math.abs(chord - spread_each)).toBeLessThan(tolerance)
    expect(Math.abs(hem + n * chord - (outputs.new_hem_chord_sum ?? 0))).toBeLessThan(tolerance)
  })

  it('matched panels are cut to whole repeats', () => {
    const { inputs, outputs } = example('repeat')
    const repeats = evaluateFormula(parseFormula('length / repeat'), inputs)
    expect(Math.ceil(repeats) * (inputs.repeat ?? 0)).toBe(outputs.cut)
  })
})
