import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'

/** Front or back of a skirt: which rules it is drawn by. */
export interface SkirtHalf {
  readonly piece: PiecePen
  readonly side: 'front' | 'back'
  /** Depths from the waist level to the points of the darts that are drawn, from the centre outwards: rule ids. */
  readonly dartLengths: readonly string[]
  /** mm that each of them takes out. */
  readonly intake: number
}

/** A dart that takes out less than this is left to the side seam, mm. */
export const leastDart = 4
/** Common practice: a dart that takes out more than this stands off the body at its point, mm. */
const deepDart = 45

/** Marks of levels, hip and dart points, in drafting order. */
export function skirtMarks(pen: Pen, piece: PiecePen, side: 'front' | 'back'): SkirtHalf {
  const front = side === 'front'
  if (front) piece.start('centreWaist', { x: 0, y: 0 }, 'Mark the waist on the fold')
  else {
    piece.start('waistLevel', { x: 0, y: 0 }, 'Mark the level of the waist on the centre back')
    piece.go('centreWaist', 'waistLevel', 'down', 'centreBackDrop', {
      say: 'Come down: the waist dips at the centre back',
      round: 'down',
    })
  }
  const level = front ? 'centreWaist' : 'waistLevel'
  piece.go('hipLevel', level, 'down', 'hipLine', { say: 'Come down to the level of the hip' })
  piece.go('centreHem', level, 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  piece.go('hip', 'hipLevel', 'right', 'skirtQuarter', {
    say: 'Go across a quarter of the hip with its ease, or of the waist where that is wider',
    round: 'up',
    shared: true,
  })
  pen.tag({ piece: piece.id, from: level, to: 'centreHem', label: 'Length', value: 'length' })
  pen.tag({ piece: piece.id, from: 'hipLevel', to: 'hip', label: 'Quarter', step: `${piece.id}.hip` })
  const darts = pen.value(front ? 'frontDarts' : 'backDarts')
  const intake = pen.onTape(Math.max(0, pen.value(front ? 'frontTakes' : 'backTakes')) / darts)
  if (intake < leastDart) return { piece, side, dartLengths: [], intake: 0 }
  if (intake > deepDart) {
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
  const dartLengths = Array.from({ length: darts }, (_, index) =>
    index === 1 && !front ? 'backDartShorter' : `${side}DartLong`,
  )
  dartLengths.forEach((by, index) => {
    const second = index === 1
    const foot = `dartFoot${index + 1}`
    piece.go(foot, second ? 'dartFoot1' : level, 'right', `${side}Dart${second ? 'Between' : 'Out'}`, {
      say: second ? 'Go on to the middle of the next dart' : 'Go across to the middle of the dart',
    })
    piece.go(`dartTip${index + 1}`, foot, 'down', by, { say: 'Come down to the point of the dart' })
  })
  return { piece, side, dartLengths, intake }
}
