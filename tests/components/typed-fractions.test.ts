import { expect, it } from 'vitest'
import { plainText, typesetTyped } from '@/components/ui/typed-fractions'
import { typesetFractions } from '@/drafting/drawing/typeset'

it('type set comes back as it was typed', () => {
  expect(plainText(typesetFractions('36 1/2 in'))).toBe('36 1/2 in')
  expect(plainText(typesetTyped('7 3/8'))).toBe('7 3/8')
})

it('keeps the length of the text while it is being typed, so that the caret does not jump', () => {
  expect(typesetTyped('7 3/8')).toHaveLength('7 3/8'.length)
})
