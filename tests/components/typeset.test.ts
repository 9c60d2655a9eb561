import { describe, expect, it } from 'vitest'
import { plainText, typeset, typesetTyped } from '@/components/ui/typeset'

describe('setting lengths as type', () => {
  it('draws a real fraction close to its whole number and the unit a thin space off', () => {
    expect(typeset('36 1/2 in')).toBe('36\u200a1\u20442\u2009in')
  })

  it('sets every length of a sum', () => {
    expect(typeset('35 ÷ 6 + 1 1/2 ≈ 7 3/8')).toBe('35 ÷ 6 + 1\u200a1\u20442 ≈ 7\u200a3\u20448')
  })

  it('leaves words and decimals alone', () => {
    expect(typeset('and/or 92.7 cm')).toBe('and/or 92.7\u2009cm')
  })

  it('comes back as it was typed', () => {
    expect(plainText(typeset('36 1/2 in'))).toBe('36 1/2 in')
    expect(plainText(typesetTyped('7 3/8'))).toBe('7 3/8')
  })

  it('keeps the length of the text while it is being typed, so that the caret does not jump', () => {
    expect(typesetTyped('7 3/8')).toHaveLength('7 3/8'.length)
  })
})
