import { expect, test } from 'vitest'
import { alignedTable, benchRows, duration } from '../../scripts/testing/bench-table.mjs'
import { timingOf } from '../bench/support/bench'

test('durations are shown in the unit that reads best', () => {
  expect([2500, 31.26, 0.0046, 0.000075].map(duration)).toEqual(['2.50 s', '31.3 ms', '4.60 µs', '75.0 ns'])
})

test('an aim is met only when both the median and the 95th percentile are', () => {
  const verdicts = benchRows([
    { name: 'a', median: 1, p95: 3, aim: 2, aim95: 4 },
    { name: 'b', median: 1, p95: 5, aim: 2, aim95: 4 },
    { name: 'c', median: 3, p95: 4, aim: 2 },
  ]).map((row) => row[4])
  expect(verdicts).toEqual(['met', 'missed', 'missed'])
})

test('a ratio says how many times as fast this one is', () => {
  const [, ours] = benchRows([
    { name: 'theirs', median: 0.2, p95: 0.3 },
    { name: 'ours', median: 0.01, p95: 0.02, against: 'theirs' },
  ])
  expect(ours?.[5]).toBe('20.0 × as fast')
})

test('columns line up', () => {
  const lines = alignedTable(['what', 'median', 'p95'], [['offset', '9.00 µs', '12.0 µs']])
  expect(lines).toEqual(['what     median      p95', 'offset  9.00 µs  12.0 µs'])
})

test('median and 95th percentile come from the sorted durations', () => {
  const durations = Array.from({ length: 100 }, (_, n) => 100 - n)
  expect(timingOf(durations)).toEqual({ median: 51, p95: 96 })
})
