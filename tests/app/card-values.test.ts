import { describe, expect, it } from 'vitest'
import {
  cautionsByField,
  estimatesByField,
  fieldText,
  lengthsOf,
  readValue,
} from '@/app/(workroom)/cards/_parts/card-values'

describe('a field of a measure card', () => {
  it.each(['36 1/2', '36-1/2', '36½', '36.5in', '36 1/2"', '92,71 cm', '3\' 0 1/2"'])('reads %s', (text) => {
    expect(readValue('bust', text, 'in', {}).kept?.mm).toBeCloseTo(927.1, 3)
  })

  it('does not drift when the unit is changed a hundred times', () => {
    const value = readValue('bust', '36 1/2', 'in', {})
    for (let turn = 0; turn < 100; turn += 1) fieldText(value, turn % 2 ? 'in' : 'cm')
    expect(value.kept?.mm).toBe(927.1)
    expect(fieldText(value, 'in')).toBe('36 1/2')
    expect(fieldText(value, 'cm')).toBe('92.7')
  })

  it('keeps the last good length while what stands there cannot be read', () => {
    const good = readValue('bust', '36 1/2', 'in', {})
    const bad = readValue('bust', '36 1/0', 'in', good)
    expect(bad.refused?.message).toMatch(/0 below the line/)
    expect(lengthsOf({ bust: bad })).toEqual({ bust: 927.1 })
  })

  it('refuses a length no body has, and names the range', () => {
    const refused = readValue('bust', '3', 'in', {}).refused
    expect(refused?.message).toMatch(/Bust is from .* in to .* in/)
  })

  it('is emptied by emptying it', () => {
    expect(readValue('bust', '  ', 'in', readValue('bust', '36', 'in', {}))).toEqual({})
  })

  it('says at the waist that it is odd against the bust', () => {
    const values = { bust: readValue('bust', '36', 'in', {}), waist: readValue('waist', '60', 'in', {}) }
    expect(cautionsByField(values, 'in').waist).toMatch(/Waist 60 in is large for bust 36 in/)
  })

  it('offers what a draft would go by until it is measured, and by which rule', () => {
    const estimates = estimatesByField({ bust: readValue('bust', '36', 'in', {}) }, 'in')
    expect(estimates.neckBase).toMatch(/^≈ \d+.* in, neck base from bust$/)
  })
})
