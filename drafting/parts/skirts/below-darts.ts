import type { RuleDefinition } from '../../contract'
import { geometry, lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import { dartLong, dartsTaken } from './marks'
import type { SewnTo } from './skirt'
import { findSide, type Fitting, type Ground } from './waist'

/** Where the darts of each half stand when the first meets that of a bodice. */
export const belowDartRules: readonly RuleDefinition[] = [
  lengthRule(
    'frontDartBelow',
    'First front dart, below the bodice’s',
    'frontDartOut + frontDartMoved',
    geometry,
  ),
  lengthRule('frontDartNext', 'From it to the next front dart', 'frontDartBetween - frontDartNearer'),
  lengthRule('backDartBelow', 'First back dart, below the bodice’s', 'backDartOut + backDartMoved', geometry),
  lengthRule('backDartNext', 'From it to the next back dart', 'backDartBetween - backDartNearer'),
]

export const belowDartFound = {
  frontDartMoved: 'length',
  frontDartNearer: 'length',
  backDartMoved: 'length',
  backDartNearer: 'length',
} as const

const sides = ['front', 'back'] as const
/** A second dart stands at least so far inside the side, as a share of the half waist, and so far from the first, mm. */
const inside = 0.86
const leastBetween = 40
/** Between the mouths of two darts, mm, so that the cloth folded into one does not reach the other. */
const clearBetween = 20

interface Move {
  readonly moved: number
  readonly nearer: number
}

/**
 * States how far the first darts are moved so that they meet the darts or seams of the bodice, whose folds they carry on, and
 * how much nearer the second then stands. Where there is no dart above or below, or no room, they stay where a skirt has them.
 */
export function meetDarts(
  pen: Pen,
  sewnTo: SewnTo,
  fitting: () => Pick<Fitting, 'hip' | 'hem' | 'close'>,
): void {
  const { made, uses } = pen.follow(() => movesOf(pen, sewnTo, fitting()))
  sides.forEach((side, index) => {
    const { moved, nearer } = made[index as 0 | 1]
    pen.find(`${side}DartMoved`, moved, sewnTo.uses | uses)
    pen.find(`${side}DartNearer`, nearer, sewnTo.uses | uses)
  })
}

function movesOf(
  pen: Pen,
  sewnTo: SewnTo,
  fitting: Pick<Fitting, 'hip' | 'hem' | 'close'>,
): readonly [Move, Move] {
  const stay: Move = { moved: 0, nearer: 0 }
  const moves: [Move, Move] = [stay, stay]
  const wanted = [sewnTo.front.length, sewnTo.back.length] as const
  const rise = pen.lengthRounded('sideRise', 'down')
  const guess = pen.length('sideTakes')
  for (let round = 0; round < 4; round += 1) {
    const grounds = [groundOf(pen, 'front', moves[0]), groundOf(pen, 'back', moves[1])] as const
    const found = findSide(grounds, { ...fitting, rise, wanted, guess })
    sides.forEach((side, index) => {
      const [joint, now] = [sewnTo[side].joints[0], found?.joints[index]]
      const before = moves[index as 0 | 1]
      moves[index as 0 | 1] =
        joint === undefined || now === undefined
          ? stay
          : (withRoom(pen, side, before.moved + joint - now, sewnTo[side].length) ?? stay)
    })
  }
  return moves
}

/** The first dart moved by so much, the second as far as that leaves room; undefined where it leaves none. */
function withRoom(pen: Pen, side: 'front' | 'back', moved: number, waist: number): Move | undefined {
  const { darts, intake } = dartsTaken(pen, side)
  const first = pen.value(`${side}DartOut`) + moved
  if (first < 30 || first > waist * inside) return undefined
  if (darts < 2) return { moved, nearer: 0 }
  const between = pen.value(`${side}DartBetween`)
  const nearer = Math.max(0, first + between - waist * inside)
  return between - nearer < Math.max(leastBetween, intake + clearBetween) ? undefined : { moved, nearer }
}

/** A half as its marks will stand. */
function groundOf(pen: Pen, side: 'front' | 'back', { moved, nearer }: Move): Ground {
  const { darts, intake } = dartsTaken(pen, side)
  const first = pen.value(`${side}DartOut`) + moved
  const next = pen.value(`${side}DartBetween`) - nearer
  return {
    centre: { x: 0, y: side === 'front' ? 0 : pen.lengthRounded('centreBackDrop', 'down') },
    points: Array.from({ length: darts }, (_, index) => ({
      x: first + index * next,
      y: pen.length(dartLong(side, index)),
    })),
    intake,
  }
}
