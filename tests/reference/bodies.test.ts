import { describe, expect, it } from 'vitest'
import {
  completeCard,
  estimates,
  relations,
  reviewMeasurements,
  sizeTables,
  type Card,
} from '@/drafting/body'
import { readCsv } from './read-csv'

const columns: Readonly<Record<string, string>> = {
  stature: 'height',
  chestcircumference: 'bust',
  buttockcircumference: 'hip',
  neckcircumferencebase: 'neckBase',
  shoulderlength: 'shoulderLength',
  wristcircumference: 'wrist',
  sleeveoutseam: 'armLength',
  acromionradialelength: 'shoulderToElbow',
  cervicaleheight: 'napeToFloor',
  headcircumference: 'head',
}

function sizes(table: string): readonly Card[] {
  return sizeTables.find(({ id }) => id === table)?.sizes.map(({ card }) => card) ?? []
}

describe('published sizes', () => {
  it('are those of ASTM D5585-11e1', () => {
    const rows = readCsv('astm-d5585-11e1-girths.csv').filter(({ unit }) => unit === 'in')
    const row = (name: string) => rows.find(({ measurement }) => measurement === name) ?? {}
    const names = ['00', '0', '2', '4', '6', '8', '10', '12', '14', '16', '18', '20']
    const cards = sizes('astm-d5585')
    names.forEach((name, at) => {
      const [curvy, straight] = [cards[2 * at], cards[2 * at + 1]]
      const printed = (measurement: string) => Number(row(measurement)[name]) * 25.4
      expect(curvy).toEqual({
        head: printed('Head girth'),
        neckBase: printed('Neck base girth'),
        upperBust: printed('Upper-chest girth'),
        bust: printed('Chest/bust girth'),
        underBust: printed('Under-bust girth'),
        waist: printed('Waist girth (curvy)'),
      })
      expect(straight).toEqual({ ...curvy, waist: printed('Waist girth (straight)') })
    })
  })

  it('are those of EN 13402-3', () => {
    const printed = readCsv('en-13402-3-women.csv').map((row) => ({
      bust: Number(row.bust_mid_cm) * 10,
      waist: Number(row.waist_mid_MEMORY) * 10,
      hip: Number(row.hip_mid_MEMORY) * 10,
    }))
    expect(sizes('en-13402-3')).toEqual(printed)
  })

  it('are those of JIS L 4005', () => {
    const printed = readCsv('jis-l-4005-a-type.csv').map((row) => ({
      height: 1580,
      bust: Number(row.bust_cm) * 10,
      hip: Number(row.hip_A_cm) * 10,
    }))
    expect(sizes('jis-l-4005-a')).toEqual(printed)
  })
})

describe('ANSUR II, 1,986 women', () => {
  const regressions = readCsv('ansur-ii-female-regressions-cm.csv').filter(
    ({ y = '', x = '' }) => y in columns && x in columns,
  )

  it.each(regressions)('$y by $x: the estimate lies on the regression', ({ y = '', x = '', a, b }) => {
    const rule = estimates[columns[y] ?? '']
    const by = columns[x] ?? ''
    expect(rule?.uses).toEqual([by])
    const row = readCsv('ansur-ii-female-percentiles-cm.csv').find(({ column }) => column === x)
    for (const percentile of ['p5_cm', 'p50_cm', 'p95_cm']) {
      const mm = Number(row?.[percentile]) * 10
      const printed = Number(a) * 10 + Number(b) * mm
      expect(Math.abs((rule?.estimate({ [by]: mm }) ?? NaN) - printed)).toBeLessThan(0.01)
    }
  })

  it.each(regressions)(
    '$y by $x: nobody within three deviations is called odd',
    ({ y = '', x = '', a, b, resid_sd }) => {
      const relation = relations.find(
        ({ judged, by }) => judged === columns[y] && by.length === 1 && by[0] === columns[x],
      )
      const row = readCsv('ansur-ii-female-percentiles-cm.csv').find(({ column }) => column === x)
      const mean = Number(row?.mean_cm) * 10
      const expected = Number(a) * 10 + Number(b) * mean
      const [low, high] = relation?.bounds(mean) ?? [NaN, NaN]
      expect(low).toBeLessThanOrEqual(expected - 29.9 * Number(resid_sd))
      expect(high).toBeGreaterThanOrEqual(expected + 29.9 * Number(resid_sd))
    },
  )

  it.each(['p5_cm', 'p50_cm', 'p95_cm'])(
    'a body of the survey (%s throughout) is plausible',
    (percentile) => {
      const rows = readCsv('ansur-ii-female-percentiles-cm.csv')
      const card = Object.fromEntries(
        rows
          .filter(({ column = '' }) => column in columns)
          .map((row) => [columns[row.column ?? ''] ?? '', Number(row[percentile]) * 10] as const),
      )
      expect(Object.keys(card)).toHaveLength(10)
      expect(reviewMeasurements(card)).toEqual([])
      expect(reviewMeasurements(completeCard(card).card)).toEqual([])
    },
  )

  it('an inch figure typed as centimetres falls below every woman measured', () => {
    const rows = readCsv('ansur-ii-female-percentiles-cm.csv')
    for (const column of [
      'chestcircumference',
      'buttockcircumference',
      'neckcircumferencebase',
      'sleeveoutseam',
    ]) {
      const row = rows.find((one) => one.column === column)
      const id = columns[column] ?? ''
      for (const percentile of ['p1_cm', 'p50_cm', 'p99_cm', 'max_cm']) {
        const typed = (Number(row?.[percentile]) * 10) / 2.54
        const [caution] = reviewMeasurements({ [id]: typed })
        expect(caution?.code, `${id} ${typed}`).toBe('inch-as-centimetre')
      }
    }
  })
})
