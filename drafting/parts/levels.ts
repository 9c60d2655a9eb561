import type { Path } from '../contract'
import { intersections, pathLength } from '../geometry'
import { fitAcross, type Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'

/** From the centre to the side at a level of the body, ending on the stitch line; undefined where the seam does not reach. */
function across(piece: PiecePen, y: number): Path | undefined {
  const met = intersections(piece.edge('side').path, straight({ x: -50, y }, { x: 4000, y }))[0]
  return met && straight({ x: 0, y }, met.point)
}

/** The girths of a dress in quarters at bust, waist and hip, with the levels drawn where they lie. */
export function fitLevels(pen: Pen, front: PiecePen, back: PiecePen): void {
  const pieces = [front, back]
  // A neck lower than the bust leaves no whole girth there to measure.
  const whole = pieces.every((piece) => piece.at('centreNeck').y < piece.at('underarm').y)
  const bust = pieces.map((piece) => {
    const end = piece.at('underarm')
    return { piece: piece.id, path: straight({ x: 0, y: end.y }, end), times: 2, length: end.x }
  })
  // Rounding to the tape moves the girth; the ease asked for is then what the tape gives.
  const drawn = bust.reduce((sum, one) => sum + one.times * one.length, 0)
  const asked = pen.tape ? drawn - pen.value('bust') : pen.value('bustEase')
  const corrected = Math.abs(drawn - pen.value('bust') - asked) > 0.5
  if (whole) pen.fit(fitAcross('bust', corrected ? 'shown' : 'equal', asked, pen.value('bust'), bust))
  for (const [id, rule] of [
    ['waist', 'waistLevel'],
    ['hip', 'hipLevel'],
  ] as const) {
    const y = pen.value(rule)
    const paths = pieces.map((piece) => ({ piece, path: across(piece, y) }))
    if (paths.some(({ path }) => !path)) continue
    const girths = paths.map(({ piece, path }) => ({
      piece: piece.id,
      path: path as Path,
      times: 2,
      length: pathLength(path as Path),
    }))
    const girth = girths.reduce((sum, one) => sum + 2 * one.length, 0)
    const least = pen.value(id)
    if (girth < least) {
      pen.refuse({
        field: 'bustEase',
        code: 'impossible-shape',
        message: `At the ${id} the dress would be ${pen.say(girth)} round, the body is ${pen.say(least)}. Give at least ${pen.say(pen.value('bustEase') + least - girth)} bust ease, or more flare.`,
        min: pen.value('bustEase') + least - girth,
      })
    }
    pen.fit(fitAcross(id, 'at-least', 0, least, girths))
    for (const { piece, path } of paths) {
      piece.inner(
        `${id}-level`,
        'level',
        path as Path,
        `Mark the level of the ${id}`,
        pen.usesOf([rule]) | piece.edge('side').uses,
      )
    }
  }
  armholeFit(pen, front, back)
  const around = (
    id: string,
    edge: string,
    relation: 'shown' | 'at-least',
    ease: number,
    body?: number,
  ): void =>
    pen.fit(
      fitAcross(
        id,
        relation,
        ease,
        body,
        pieces.map((piece) => ({
          piece: piece.id,
          path: piece.edge(edge).path,
          times: 2,
          length: piece.lengthOf(edge),
        })),
      ),
    )
  const neck = 2 * (front.lengthOf('neckline') + back.lengthOf('neckline'))
  const chokes = neck < pen.value('neckBase')
  around('neck', 'neckline', chokes ? 'shown' : 'at-least', 0, pen.value('neckBase'))
  if (chokes) {
    pen.caution(
      'neck-tight',
      `The neckline is ${pen.say(neck)} round, the neck ${pen.say(pen.value('neckBase'))}: open it wider or deeper.`,
      'neckWidening',
      'frontNeckDrop',
    )
  }
  around('hem', 'hem', 'shown', 0)
  acrossArmholes(pen, front, 'acrossFront')
  acrossArmholes(pen, back, 'acrossBack')
}

function armholeFit(pen: Pen, front: PiecePen, back: PiecePen): void {
  pen.fit(
    fitAcross(
      'armhole',
      'at-least',
      0,
      pen.value('upperArm'),
      [front, back].map((piece) => ({
        piece: piece.id,
        path: piece.edge('armhole').path,
        times: 1,
        length: piece.lengthOf('armhole'),
      })),
    ),
  )
}

/** The width between the armholes where they are deepest, against the body's. */
function acrossArmholes(pen: Pen, piece: PiecePen, measurement: 'acrossFront' | 'acrossBack'): void {
  const end = piece.at('hollow')
  if (piece.at('centreNeck').y > end.y) return
  pen.fit(
    fitAcross(measurement, 'shown', 0, pen.value(measurement), [
      { piece: piece.id, path: straight({ x: 0, y: end.y }, end), times: 2, length: end.x },
    ]),
  )
}
