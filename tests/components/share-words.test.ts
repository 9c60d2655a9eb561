import { expect, test } from 'vitest'
import { firstChoices, patternAddress } from '@/components/print/print-choices'
import { dayAhead, dayInWords } from '@/components/print/share-words'

test('a link of a month ends on the same day of the calendar, across the end of a year', () => {
  expect(dayAhead(30, new Date(2026, 11, 15, 23, 30))).toBe('2027-01-14')
  expect(dayAhead(1, new Date(2028, 1, 28))).toBe('2028-02-29')
  expect(dayInWords('2027-01-14')).toBe('14 January 2027')
})

test('the address of a file says what was chosen, and of a single sheet nothing about paper', () => {
  expect(
    patternAddress('/api/shared/t', 'pdf', { ...firstChoices, paper: 'letter', allowances: false }),
  ).toBe('/api/shared/t/pattern.pdf?allowances=no&paper=letter&orientation=fewest')
  expect(patternAddress('/api/shared/t', 'svg', firstChoices)).toBe(
    '/api/shared/t/pattern.svg?allowances=yes',
  )
})
