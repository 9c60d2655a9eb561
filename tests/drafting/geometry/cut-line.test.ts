import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { cutLine } from '../../../drafting/pieces/cut-line'
import * as shapes from './pieces'
import { cutLineFaults } from './cut-line-faults'

const allowances = fc.array(
  fc.oneof(fc.double({ min: 0, max: 40, noNaN: true }), fc.constantFrom(0, 6, 10, 15, 40)),
  {
    minLength: 8,
    maxLength: 8,
  },
)
const between = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true })
const corner = fc.constantFrom('mitre', 'square', 'turned', 'step') as fc.Arbitrary<shapes.CornerName>

const pieces: readonly [string, fc.Arbitrary<shapes.Shape>][] = [
  ['bodices', fc.tuple(allowances, between(0.7, 1.5), between(0, 0.6)).map((v) => shapes.bodice(...v))],
  ['sleeves', fc.tuple(allowances, between(0.6, 1.5), between(60, 190)).map((v) => shapes.sleeve(...v))],
  [
    'circle skirt panels',
    fc
      .tuple(allowances, between(60, 400), between(200, 1100), between(20, 180))
      .map((v) => shapes.circlePanel(...v)),
  ],
  ['facings', fc.tuple(allowances, between(8, 90)).map((v) => shapes.facing(...v))],
  ['crescents', fc.tuple(allowances, between(4, 60)).map((v) => shapes.crescent(...v))],
  ['V necks', fc.tuple(allowances, between(30, 320), between(20, 110)).map((v) => shapes.vNeck(...v))],
  ['keyholes', fc.tuple(allowances, between(12, 40), between(1, 20)).map((v) => shapes.keyhole(...v))],
  [
    'darted skirts',
    fc
      .tuple(
        allowances,
        fc.constantFrom('centre', 'side', 'up', 'down') as fc.Arbitrary<'centre' | 'side' | 'up' | 'down'>,
        between(2, 70),
      )
      .map((v) => shapes.darted(...v)),
  ],
]

describe('the cut line of any piece', () => {
  test.each(pieces)(
    '%s: closed, clockwise, simple, round the stitch line and the allowance away from it',
    (_, piece) => {
      fc.assert(
        fc.property(piece, (shape) => {
          expect(cutLineFaults(shape, cutLine(shape.edges, shape.darts))).toEqual([])
        }),
        { numRuns: 25 },
      )
    },
    60_000,
  )

  test.each(pieces)(
    '%s: with corners of every kind',
    (_, piece) => {
      fc.assert(
        fc.property(piece, fc.array(corner, { minLength: 8, maxLength: 8 }), (shape, corners) => {
          const turned = shapes.withCorners(shape, corners)
          expect(cutLineFaults(turned, cutLine(turned.edges, turned.darts))).toEqual([])
        }),
        { numRuns: 25 },
      )
    },
    60_000,
  )
})
