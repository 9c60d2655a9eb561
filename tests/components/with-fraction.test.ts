import { expect, it } from 'vitest'
import { withFraction } from '@/components/sheet/with-fraction'

it.each([
  ['7 3/8', '1/2', '7 1/2'],
  ['7', '3/8', '7 3/8'],
  ['7 3/8', '0', '7'],
  ['3/8', '1/2', '1/2'],
  ['3/8', '0', '0'],
  ['', '1/8', '1/8'],
  ['12 1/2', '7/8', '12 7/8'],
])('the eighths keys leave the whole inches: %s with %s is %s', (text, key, result) => {
  expect(withFraction(text, key)).toBe(result)
})
