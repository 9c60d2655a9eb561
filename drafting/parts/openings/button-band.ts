import type { DesignValue, Path, Point, RuleDefinition } from '../../contract'
import {
  applyTo,
  intersections,
  mirrorX,
  openPath,
  reversePath,
  slicePath,
  startOf,
  startTangent,
  transformPath,
  line,
} from '../../geometry'
import { count, length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { chosenNeckline } from '../necklines'
import { buttonLevels } from './button-levels'
import { onFold, type OpenHalf, type Opening } from './opening'

const worn = { id: 'backOpening', is: ['button band'] }

export const buttonDesign: readonly DesignValue[] = [
  length('buttonSize', 'Button', 'opening', { default: 15, min: 8, max: 30 }, worn),
  count(
    'buttonsToBust',
    'Spaces from the top button to the bust',
    'opening',
    { default: 2, min: 1, max: 6 },
    worn,
  ),
  length('frontAllowance', 'Front edge allowance', 'allowances', { default: 10, min: 0, max: 20 }, worn),
]

/** The front laps over by half a button and what keeps it clear of the edge. Common practice, no published source. */
export const buttonRules: readonly RuleDefinition[] = [
  lengthRule('frontOverlap', 'Front laps over by', 'buttonSize / 2 + 0.6cm'),
  lengthRule('topButton', 'First button below the neckline', 'buttonSize / 2 + 0.5cm'),
  lengthRule('bustButton', 'Button at the bust, below the side neck', 'bustHeight'),
  lengthRule('buttonhole', 'Length of a buttonhole', 'buttonSize + 0.3cm'),
]

/** Buttons down the whole front: both fronts run on beyond the centre and lap over each other; the back on the fold. */
export const buttonBand: Opening = {
  draw: (pen, front, back) => {
    lapFront(pen, front)
    onFold(back)
    return { front: { kind: 'lap', below: front.below }, back: { kind: 'fold' } }
  },
}

/** Runs a front on beyond its centre, with buttons and buttonholes along the centre line, one of them at the bust. */
export function lapFront(pen: Pen, { piece: front, foot, below }: OpenHalf): void {
  front.go('overlapFoot', foot, 'left', 'frontOverlap', {
    say: 'Go on beyond the centre front by the overlap',
    round: 'up',
  })
  const out = front.at(foot).x - front.at('overlapFoot').x
  const top = lapTop(pen, front, out)
  front.place('overlapNeck', startOf(top), {
    say: 'Up the overlap mark where the neckline ends',
    through: ['overlapFoot', 'centreNeck'],
    mask: front.edge('neckline').uses,
  })
  front.line('overlap-foot', foot, 'overlapFoot', {
    role: below.role,
    allowance: below.allowance,
    ...(below.finish ? { finish: below.finish } : {}),
    say: 'Run the lower edge on to the end of the overlap',
  })
  front.line('opening', 'overlapFoot', 'overlapNeck', {
    role: 'opening',
    finish: 'seam',
    allowance: 'frontAllowance',
    say: 'The front edge, faced',
  })
  front.curve('overlap-neck', top, 'overlapNeck', 'centreNeck', {
    role: 'free',
    finish: 'seam',
    allowance: 'neckAllowance',
    say: 'Run the neckline on over the overlap, so that both fronts lie on each other',
    mask: front.edge('neckline').uses,
  })
  const centre = straight(front.at('centreNeck'), front.at(foot))
  front.inner('centre-front', 'level', centre, 'Mark the centre front', front.usesOf('centreNeck', foot))
  buttonUp(pen, front, foot)
}

/** The top of the overlap, from its end to the centre: the neckline mirrored, run on or level. */
function lapTop(pen: Pen, front: PiecePen, out: number): Path {
  const neckline = front.edge('neckline').path
  const centre = front.at('centreNeck')
  const { over } = chosenNeckline(pen)
  const level = openPath([line({ x: centre.x - out, y: centre.y }, centre)])
  if (over === 'level') return level
  if (over === 'straight on') {
    const along = startTangent(neckline)
    const end: Point = { x: centre.x - out, y: centre.y - (along.y / along.x) * out }
    return openPath([line(end, centre)])
  }
  const met = intersections(neckline, straight({ x: out, y: -2000 }, { x: out, y: 3000 }))[0]
  if (!met) return level
  const mirrored = transformPath(mirrorX, reversePath(slicePath(neckline, 0, met.a)))
  const segments = [...mirrored.segments]
  segments[0] = { ...segments[0]!, from: applyTo(mirrorX, { x: out, y: met.point.y }) }
  const last = segments.length - 1
  segments[last] = { ...segments[last]!, to: centre }
  return openPath(segments)
}

/** Marks buttons and buttonholes on the centre line, evenly from the neckline over the bust to the foot. */
function buttonUp(pen: Pen, front: PiecePen, foot: string): void {
  const top = front.at('centreNeck').y + pen.value('topButton')
  const levels = buttonLevels(pen, top, pen.value('bustButton'), front.at(foot).y)
  const long = pen.value('buttonhole')
  // A buttonhole begins a little beyond the button's place, where the button will pull.
  const beyond = 3
  const uses = pen.usesOf(['topButton', 'bustButton', 'buttonsToBust']) | front.usesOf('centreNeck', foot)
  levels.forEach((y, index) => {
    front.place(
      `button-${index + 1}`,
      { x: 0, y },
      {
        say: 'Mark a button on the centre front of the left, a buttonhole on the right',
        kind: 'button',
        mask: uses,
      },
    )
    front.inner(
      `buttonhole-${index + 1}`,
      'placement',
      straight({ x: -beyond, y }, { x: long - beyond, y }),
      'Mark the buttonhole across the centre front',
      uses | pen.usesOf(['buttonhole']),
    )
  })
  pen.notion({ kind: 'button', count: levels.length })
}
