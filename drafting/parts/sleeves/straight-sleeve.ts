import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { backFullness, frontFullness } from '../sleeve-head'
import { solveHead } from '../solve-head'
import type { Halves, SetInKind } from './sleeve-kind'

/** Bounds of a sleeve head's height as a share of the armhole. Common practice: a shirt's is the lowest. */
const lowestHead = 0.18
const highestHead = 0.33

/**
 * Marks the head that every kind starts from: the crown and the underarm level, found so that the head fits its armhole.
 *
 * @param armhole lengths of the armhole's halves, mm.
 * @param head lengths of the halves of the head, mm.
 * @param uses what those lengths follow from.
 */
export function markHead(
  pen: Pen,
  sleeve: PiecePen,
  join: SetInKind['join'],
  armhole: Halves,
  head: Halves,
  uses: Mask,
): void {
  const shape = solveShape(pen, join, armhole.front + armhole.back, head)
  pen.find('headHeight', shape.height, uses)
  pen.find('frontGirth', shape.front, uses)
  pen.find('backGirth', shape.back, uses)
  sleeve.start('crown', { x: 0, y: 0 }, 'Mark the top of the sleeve on a line that lies with the grain')
  sleeve.go('underarmLevel', 'crown', 'down', 'headHeight', {
    say: 'Come down the height of the head, found so that the head fits the armhole',
    round: 'down',
    stepKind: 'solve',
  })
  sleeve.go('frontUnderarm', 'underarmLevel', 'right', 'frontGirth', {
    say: 'Go out to the front by the front part of the girth',
    drag: ['sleeveEase'],
    round: 'up',
    stepKind: 'solve',
  })
  sleeve.go('backUnderarm', 'underarmLevel', 'left', 'backGirth', {
    say: 'Go out to the back by the back part of the girth',
    round: 'up',
    stepKind: 'solve',
  })
}

/** Marks the hem level of a straight sleeve below its head. */
export function markHem(pen: Pen, sleeve: PiecePen, kind: SetInKind): void {
  const height = pen.value('headHeight')
  pen.find(
    'underarmLength',
    pen.length(kind.length) - pen.length('headHeight'),
    pen.usesOf(['headHeight', kind.length]),
  )
  const least = height + shortestUnderarm(pen, kind)
  if (pen.length(kind.length) < least) {
    pen.refuse({
      field: kind.lengthField,
      code: 'impossible-shape',
      message: `The sleeve ends above the underarm, or so near it that its hem cannot be turned up. Make it at least ${pen.say(least)} long.`,
      ...(kind.lengthField === kind.length ? { min: least } : {}),
    })
  }
  sleeve.go('hemLevel', 'crown', 'down', kind.length, {
    say: 'From the top come down the sleeve length',
    drag: [kind.lengthField],
  })
  pen.tag({
    piece: 'sleeve',
    from: 'crown',
    to: 'hemLevel',
    label: 'Sleeve length',
    ...(kind.lengthField === kind.length ? { value: kind.length } : {}),
  })
}

/** The underarm seam, mm, must reach over what the hem turns up: above it the sleeve grows out into its head. */
function shortestUnderarm(pen: Pen, kind: SetInKind): number {
  if (kind.hem === 'gathered' || kind.hem === 'dipped') return 25
  return Math.max(25, pen.value('sleeveHemAllowance') + 6 + 2 * (pen.tape ?? 0))
}

/** Height and widths of the head. A large armhole for a thin arm would stand up like a mushroom: the girth is then let out. */
function solveShape(
  pen: Pen,
  join: SetInKind['join'],
  armhole: number,
  head: Halves,
): Halves & { readonly height: number } {
  const shapes = { front: frontFullness, back: backFullness }
  let girth = pen.value('biceps')
  let solved = solveHead(girth, head.front, head.back, shapes)
  // The front half is the shorter: it too must keep some width. Gathers fill a head however high it stands.
  const bound =
    join === 'gathered' ? Infinity : Math.min(highestHead * armhole, 0.66 * Math.min(head.front, head.back))
  if (solved && solved.height > bound) {
    // Height falls as girth grows, so a few secant steps on girth bring the height to its bound.
    for (let round = 0; round < 12 && solved && solved.height > bound + 0.01; round += 1) {
      girth += (solved.height - bound) * 2
      solved = solveHead(girth, head.front, head.back, shapes)
    }
    pen.caution(
      'sleeve-girth-let-out',
      `The armhole is large for this arm, so the sleeve is drawn ${pen.say(girth)} round the arm to keep its head from standing up. A smaller armhole keeps the sleeve closer.`,
      'sleeveEase',
      'upperArm',
    )
  }
  if (!solved || solved.height < lowestHead * armhole * 0.98) {
    pen.refuse({
      field: 'sleeveEase',
      code: 'impossible-shape',
      message: `A sleeve ${pen.say(girth)} round does not fit an armhole of ${pen.say(armhole)}. Lower the armhole or give the sleeve less ease.`,
      max: Math.max(0, armhole / 1.1 - pen.value('upperArm')),
    })
  }
  return solved
}
