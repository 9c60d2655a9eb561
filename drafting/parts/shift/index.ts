import type { Point, Run } from '../../contract'
import { distance, intersections, pathLength } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { deepenFitted } from '../armhole-room'
import { bodiceBackMarks } from '../bodice/back-marks'
import { bodiceFrontMarks } from '../bodice/front-marks'
import { faceNeckAndArmholes } from '../facings'
import { neckLeans } from '../neck-lean'
import { drawOpening } from '../openings'
import { pocketBag, pocketMouth, sewWithPocket } from '../pockets/in-seam'
import { sleeveInto } from '../sleeves'
import { armholeStretch, type Armhole } from '../sleeves/armhole'
import { drawShiftBack } from './back'
import { drawShiftFront, type ShiftHalf } from './front'
import { checkLength } from './lower'

/** Draws a shift dress from its neck to its hem, and sews, fits and faces it. */
export function drawShift(pen: Pen): void {
  deepenFitted(pen)
  checkLength(pen)
  const front = pen.piece('front', 'Front')
  const back = pen.piece('back', 'Back')
  bodiceFrontMarks(pen, front)
  bodiceBackMarks(pen, back, distance(front.at('sideNeck'), front.at('shoulderTip')))
  const leans = pen.follow(() => neckLeans(pen, front, back))
  const lean = (half: 'front' | 'back') => ({ degrees: leans.made[half], uses: leans.uses })
  const ofBack = drawShiftBack(pen, back, lean('back'))
  const ofFront = drawShiftFront(pen, front, back, lean('front'))
  const below = { edge: 'hem', role: 'hem', allowance: 'hemAllowance' } as const
  const half = (piece: PiecePen) => ({ piece, foot: 'lengthMark', below })
  const centres = drawOpening(pen, half(front), half(back))
  for (const [piece, { kind }] of [
    [front, centres.front],
    [back, centres.back],
  ] as const) {
    const onFold = kind === 'fold'
    piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
    const hip = piece.at('hipLevel').y
    piece.grain({ x: 45, y: hip }, { x: 45, y: piece.at('lengthMark').y - 30 })
  }
  pen.sew({
    id: 'shoulder',
    name: 'Shoulder',
    a: ofBack.runs('shoulder'),
    b: ofFront.runs('shoulder'),
    join: 'eased',
    easeFrom: 'shoulderEase',
    smooth: true,
  })
  sewSides(pen, ofFront, ofBack)
  fitShift(pen, [ofFront, ofBack])
  const { bare } = sleeveInto(pen, edgesOf(ofFront, 'armhole'), edgesOf(ofBack, 'armhole'))
  faceNeckAndArmholes(pen, [ofFront.faced, centres.front], [ofBack.faced, centres.back], bare, {
    runs: (piece, edge) => (piece === 'front' ? ofFront : ofBack).runs(edge),
    shoulderEase: 'shoulderEase',
  })
}

const edgesOf = (half: ShiftHalf, edge: string): Armhole =>
  half.runs(edge).map((run) => ({ piece: half.piece, edge: run.edge }))

/** Sews the sides, with pockets where they are asked for. */
function sewSides(pen: Pen, front: ShiftHalf, back: ShiftHalf): void {
  const seam = { id: 'side', name: 'Side seam', smooth: true }
  const side = back.piece.edge('side')
  const level = back.piece.at('waistLevel').y
  const mouth = pen.chosen('pockets') ? pocketMouth(pen, side.path, level) : undefined
  pen.settle()
  if (!mouth) return pen.sew({ ...seam, a: back.runs('side'), b: front.runs('side') })
  const whole = pathLength(side.path)
  pocketBag(pen, whole - mouth.from - 40, side.uses | pen.usesOf(['pocketTop']))
  const stretches =
    (half: ShiftHalf) =>
    (from: number, to: number): Run[] =>
      armholeStretch(edgesOf(half, 'side'), from, to)
  sewWithPocket(pen, seam, stretches(front), stretches(back), mouth, whole)
}

/** The girths at waist and hip, the waist with its darts closed, and their levels. */
function fitShift(pen: Pen, halves: readonly ShiftHalf[]): void {
  for (const id of ['waist', 'hip'] as const) {
    const across = halves.flatMap((half) => {
      const { piece } = half
      const [from, to] = [piece.at(`${id}Level`), sideAt(half, `${id}Level`, `${id}Side`)]
      piece.inner(
        `${id}-level`,
        'level',
        straight(from, to),
        `Mark the level of the ${id}`,
        piece.usesOf(`${id}Level`, `${id}Side`) | half.uses,
      )
      const dart = id === 'waist' && piece.marks.has('dartInner')
      const stretches = dart
        ? [straight(from, piece.at('dartInner')), straight(piece.at('dartOuter'), to)]
        : [straight(from, to)]
      return stretches.map((path) => ({ piece: piece.id, path, times: 2, length: pathLength(path) }))
    })
    const girth = across.reduce((sum, one) => sum + one.times * one.length, 0)
    const body = pen.value(id)
    // On a tape the ease is what the tape gives.
    const asked = pen.tape ? Math.min(pen.value(`${id}Ease`), girth - body) : pen.value(`${id}Ease`)
    const enough = girth >= body + asked - 1e-6
    pen.fit(fitAcross(id, enough ? 'at-least' : 'shown', asked, body, across))
  }
}

/** Where a level meets the side seam, which a correction may have moved off its mark. */
function sideAt(half: ShiftHalf, level: string, mark: string): Point {
  const [from, to] = [half.piece.at(level), half.piece.at(mark)]
  const far = straight(from, { x: to.x + 200, y: from.y + ((to.y - from.y) * (to.x + 200)) / to.x })
  const met = half.runs('side').flatMap(({ edge }) => intersections(half.piece.edge(edge).path, far))[0]
  return met?.point ?? to
}
