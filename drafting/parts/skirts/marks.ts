import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { dartAngle } from '../waist-darts'

/** Front or back of a skirt: which rules it is drawn by. */
export interface SkirtHalf {
  readonly piece: PiecePen
  readonly side: 'front' | 'back'
  /** How many darts are drawn, from the centre outwards. */
  readonly darts: number
  /** mm that each of them takes out. */
  readonly intake: number
}

/** A dart that takes out less than this is left to the side seam, mm. */
export const leastDart = 4
/** Common practice: a dart that takes out more than this stands off the body at its point, mm. */
const deepDart = 45

/** Why no point of a hem is moved. */
export const hemFollows =
  'The hem follows from the length: change that, or take in the side near the hem to make it narrower.'

/** mm that each dart of a half takes out, and how many there are: none where it would not be worth one. */
export function dartsTaken(pen: Pen, side: 'front' | 'back'): Pick<SkirtHalf, 'darts' | 'intake'> {
  const darts = pen.value(`${side}Darts`)
  const intake = pen.onTape(Math.max(0, pen.value(`${side}Takes`)) / darts)
  return intake < leastDart ? { darts: 0, intake: 0 } : { darts, intake }
}

/** Degrees between the legs of the first dart; 0 where none is drawn. */
export function firstDartAngle(pen: Pen, side: 'front' | 'back'): number {
  const { darts, intake } = dartsTaken(pen, side)
  return darts ? dartAngle(intake, pen.length(dartLong(side, 0))) : 0
}

/** The rule for the depth of a dart's point below the waist. */
export const dartLong = (side: 'front' | 'back', index: number): string =>
  index === 1 && side === 'back' ? 'backDartShorter' : `${side}DartLong`

/**
 * Marks of levels, hip and dart points, in drafting order.
 *
 * @param by ends of the rules for how far the first dart stands from the centre, and the second from the first.
 */
export function skirtMarks(
  pen: Pen,
  piece: PiecePen,
  side: 'front' | 'back',
  [out, between]: readonly [string, string],
): SkirtHalf {
  const front = side === 'front'
  const onCentre = true
  if (front) piece.start('centreWaist', { x: 0, y: 0 }, 'Mark the waist on the fold', { onCentre })
  else {
    piece.start('waistLevel', { x: 0, y: 0 }, 'Mark the level of the waist on the centre back', {
      fixed: 'It is where the drawing begins: move the centre of the waist.',
    })
    piece.go('centreWaist', 'waistLevel', 'down', 'centreBackDrop', {
      say: 'Come down: the waist dips at the centre back',
      round: 'down',
      onCentre,
    })
  }
  const level = front ? piece.byRule('centreWaist') : 'waistLevel'
  piece.go('hipLevel', level, 'down', 'hipLine', {
    say: 'Come down to the level of the hip',
    onCentre,
    shared: true,
  })
  piece.go('centreHem', level, 'down', 'length', {
    say: 'Come down the length',
    drag: ['length'],
    fixed: hemFollows,
  })
  piece.go('hip', 'hipLevel', 'right', 'skirtQuarter', {
    say: 'Go across a quarter of the hip with its ease, or of the waist where that is wider',
    round: 'up',
    shared: true,
  })
  pen.tag({ piece: piece.id, from: level, to: 'centreHem', label: 'Length', value: 'length' })
  pen.tag({ piece: piece.id, from: 'hipLevel', to: 'hip', label: 'Quarter', step: `${piece.id}.hip` })
  const { darts, intake } = dartsTaken(pen, side)
  if (intake > deepDart) sayDeep(pen, side, darts, intake)
  for (let index = 0; index < darts; index += 1) {
    const second = index === 1
    const foot = `dartFoot${index + 1}`
    piece.go(foot, second ? 'dartFoot1' : level, 'right', `${side}${second ? between : out}`, {
      say: second ? 'Go on to the middle of the next dart' : 'Go across to the middle of the dart',
      fixed: 'Move the point of the dart: the dart goes with it.',
    })
    piece.go(`dartTip${index + 1}`, foot, 'down', dartLong(side, index), {
      say: 'Come down to the point of the dart',
    })
  }
  return { piece, side, darts, intake }
}

function sayDeep(pen: Pen, side: 'front' | 'back', darts: number, intake: number): void {
  pen.caution(
    'dart-deep',
    darts === 1
      ? `The ${side} dart takes out ${pen.say(intake)}. Choose two darts: they lie flatter.`
      : `Each ${side} dart takes out ${pen.say(intake)}. Sew a toile first and shape the points on the body.`,
    `${side}Darts`,
    'waist',
    'hip',
  )
}
