import { describe, expect, it } from 'vitest'
import { measurements } from '@/drafting/body'

const ids =
  'height bust upperBust underBust waist highHip hip neckBase shoulderLength acrossShoulders acrossBack acrossFront napeToWaist frontWaistLength centreFrontToWaist bustHeight bustSpan scyeDepth armscye upperArm elbow wrist hand armLength shoulderToElbow waistToHip waistToKnee waistToFloor napeToFloor head'

describe('the measurements', () => {
  it('are the thirty that garments may ask for, each once', () => {
    expect(measurements.map(({ id }) => id).sort()).toEqual(ids.split(' ').sort())
    expect(new Set(measurements.map(({ name }) => name)).size).toBe(30)
  })

  it('stand in the order of the body', () => {
    const levels = measurements.map(({ level }) => level)
    expect(levels).toEqual([...levels].sort((a, b) => a - b))
    expect(Math.min(...levels)).toBeGreaterThan(0)
    expect(Math.max(...levels)).toBe(1)
  })

  it.each(measurements)(
    '$id is taken in one sentence, with its standard and a range',
    ({ how, standard, min, max }) => {
      expect(how).toMatch(/^[A-Z][^.]+\.$/)
      expect(standard).toMatch(/ISO 8559|ASTM D5219/)
      expect(min).toBeGreaterThan(90)
      expect(max).toBeGreaterThan(min * 1.2)
    },
  )

  it('say that the waist is the natural one', () => {
    expect(measurements.find(({ id }) => id === 'waist')?.how).toContain('natural waist')
  })
})
