import type { Path, Point } from '../../contract'
import { cubic, openPath } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { fairCurve } from '../hem'

type Half = 'front' | 'back'

/** Why marks of the side seam stay: front and back must keep the same seam. */
export const sideFixed =
  'Front and back share the side seam. Take the seam in or let it out, or change the ease, instead.'

/** Marks the hip and the hem of the back below its waist, and its quarters there. */
export function lowerMarks(pen: Pen, back: PiecePen): void {
  back.go('hipLevel', 'waistLevel', 'down', 'waistToHip', {
    say: 'From the waist come down to the hip',
    fixed: sideFixed,
  })
  back.go('lengthMark', 'waistLevel', 'down', 'length', {
    say: 'From the waist come down the length',
    drag: ['length'],
    fixed: sideFixed,
  })
  pen.tag({
    piece: 'back',
    from: 'waistLevel',
    to: 'lengthMark',
    label: 'Length below the waist',
    value: 'length',
  })
  const levels = [
    ['waistSide', 'waistLevel', 'backWaistQuarter', 'Go across a quarter of the waist', 'waistIn'],
    ['hipSide', 'hipLevel', 'backHipQuarter', 'Go across a quarter of the hip with its ease', 'hipEase'],
    ['hemSide', 'lengthMark', 'backHemQuarter', 'Go across a quarter of the hem', 'hemFlare'],
  ] as const
  for (const [id, level, by, say, drag] of levels)
    back.go(id, level, 'right', by, { say, drag: [drag], round: 'up', fixed: sideFixed })
}

/** The same on the front, so far from its closed underarm as on the back: the side seam is one for both. */
export function copyLowerMarks(front: PiecePen, back: PiecePen): void {
  const [from, to] = [back.at('underarm'), front.at('underarmClosed')]
  const uses = back.usesOf('underarm') | front.usesOf('underarmClosed')
  const copy = (id: string, x: (of: number) => number): void =>
    front.place(
      id,
      { x: x(back.at(id).x), y: back.at(id).y + to.y - from.y },
      {
        say: 'Mark the same as on the back',
        stepKind: 'copy',
        mask: uses | back.usesOf(id),
        fixed: sideFixed,
      },
    )
  for (const id of ['waistLevel', 'hipLevel', 'lengthMark']) copy(id, () => 0)
  for (const id of ['waistSide', 'hipSide', 'hemSide']) copy(id, (of) => of + to.x - from.x)
}

/** The slope at a joint, mm out a mm down: none at a waist or hip that stands in or out, else between its neighbours. */
const between = (above: number, below: number): number =>
  above * below <= 0 ? 0 : (2 * above * below) / (above + below)

/**
 * The side seam from the closed underarm through the waist and the hip to the hem: in one curve to the hip, straight below,
 * where it ends a little higher than the centre, so that the hem runs square to both.
 */
export function shiftSide(pen: Pen, piece: PiecePen, top: Point): Path {
  const [waist, hip, hem] = ['waistSide', 'hipSide', 'hemSide'].map((id) => piece.at(id)) as [
    Point,
    Point,
    Point,
  ]
  const slope = (from: Point, to: Point): number => (to.x - from.x) / (to.y - from.y)
  const [upper, middle, lower] = [slope(top, waist), slope(waist, hip), slope(hip, hem)]
  const end = hem.y - 0.35 * pen.length('backHemQuarter') * lower
  const bend = between(upper, middle)
  return openPath([
    run(top, upper, waist, bend),
    run(waist, bend, hip, lower),
    { kind: 'line', from: hip, to: { x: hip.x + lower * (end - hip.y), y: end } },
  ])
}

function run(from: Point, leaves: number, to: Point, arrives: number) {
  const third = (to.y - from.y) / 3
  return cubic(
    from,
    { x: from.x + leaves * third, y: from.y + third },
    { x: to.x - arrives * third, y: to.y - third },
    to,
  )
}

/** The hem from the end of the side to the centre. @param down unit direction of the side at its end */
export function shiftHem(side: Point, down: Point, centre: Point): Path {
  const fair = fairCurve(side, { x: -down.y, y: down.x }, centre, { x: -1, y: 0 })
  return fair ?? straight(side, centre)
}

/** Too short a dress ends above the hip, where its side still curves. */
export function checkLength(pen: Pen): void {
  const least = pen.value('waistToHip') + 120
  if (pen.value('length') >= least) return
  pen.refuse({
    field: 'length',
    code: 'impossible-shape',
    message: `The hem would be above the hip line. Make the dress at least ${pen.say(least)} long below the waist.`,
    min: least,
  })
}

/** A dart pointed at both ends, marked as two that share their mouth at the waist. Nothing is drawn where it would vanish. */
export function waistDart(
  pen: Pen,
  piece: PiecePen,
  half: Half,
  place: { readonly axis: number; readonly top: number; readonly uses: Mask },
): void {
  const intake = pen.offered('waistDarts') ? pen.value(`${half}Dart`) : 0
  if (intake < 5) return
  const level = piece.at('waistLevel').y
  const mask = place.uses | pen.usesOf([`${half}Dart`]) | piece.usesOf('waistLevel')
  const at = (id: string, x: number, y: number, say: string, uses: readonly string[] = []): void =>
    piece.place(id, { x, y }, { say, mask, uses, fixed: 'The dart follows its rule: change the waist ease.' })
  const x = place.axis
  const inner = pen.tape ? Math.floor(intake / 2 / pen.tape) * pen.tape : intake / 2
  if (inner <= 0) return
  at('dartTop', x, place.top, 'Mark the upper point of the waist dart')
  at('dartInner', x - inner, level, 'At the waist mark half its width towards the centre')
  at('dartOuter', x + inner, level, 'and half towards the side')
  at('dartLow', x, level + pen.length(`${half}DartBelow`), 'Mark its lower point', [`${half}DartBelow`])
  const say = 'Draw both legs of the dart'
  piece.innerDart('waist-dart', ['dartInner', 'dartOuter'], 'dartTop', 'centre', say)
  piece.innerDart('waist-dart-low', ['dartInner', 'dartOuter'], 'dartLow', 'centre', say)
}
