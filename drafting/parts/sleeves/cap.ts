import type { DesignValue, Path, Point, RuleDefinition } from '../../contract'
import { endOf, mirrorX, pathLength, reversePath, slicePath, transformPath } from '../../geometry'
import { length, share } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { fairCurve } from '../hem'
import { backFullness, frontFullness } from '../sleeve-head'
import { fitHead } from '../solve-head'
import { armholeLength, armholeStretch, armholeUses, type Armhole } from './armhole'
import { bindUnderarm } from './armhole-binding'
import { smoothEase, type Halves, type Sleeve } from './sleeve-kind'
import { markHead } from './straight-sleeve'

const worn = { id: 'sleeve', is: ['cap'] }

/** Common practice, no published source. */
const design: readonly DesignValue[] = [
  share(
    'capReach',
    'Part of the armhole that the cap covers',
    'sleeve',
    { default: 0.6, min: 0.5, max: 0.7 },
    worn,
  ),
  length('capDeeper', 'Cap longer in the middle by', 'sleeve', { default: 30, min: 15, max: 80 }, worn),
]

const rules: readonly RuleDefinition[] = [
  lengthRule('capLength', 'Cap sleeve: length', 'capBelow + capDeeper'),
  lengthRule('capBindingWidth', 'Width of the armhole binding', '3cm'),
]

/**
 * A cap sleeve: the upper part of a plain head, without an underarm. It ends on the armhole in front and behind; what is left
 * of the armhole is bound.
 */
export const cap: Sleeve = { design, rules, turnedUp: true, draw: drawCap }

function drawCap(pen: Pen, front: Armhole, back: Armhole): void {
  const sleeve = pen.piece('sleeve', 'Sleeve')
  const armhole = { front: armholeLength(front), back: armholeLength(back) }
  const ease = { front: pen.value(smoothEase.front), back: pen.value(smoothEase.back) }
  const head = { front: armhole.front + ease.front, back: armhole.back + ease.back }
  const uses =
    armholeUses(front) | armholeUses(back) | pen.usesOf(['biceps', smoothEase.front, smoothEase.back])
  markHead(pen, sleeve, 'eased', armhole, head, uses)
  const reach = pen.value('capReach')
  const covered = { front: reach * armhole.front, back: reach * armhole.back }
  const halves = capHalves(pen, sleeve, head, {
    front: covered.front + ease.front,
    back: covered.back + ease.back,
  })
  const ends = { front: endOf(halves.front), back: endOf(halves.back) }
  pen.find('capBelow', Math.max(ends.front.y, ends.back.y), uses | pen.usesOf(['capReach']))
  const names = ['capReach', 'biceps', smoothEase.front, smoothEase.back]
  const through = ['frontUnderarm', 'backUnderarm', 'underarmLevel', 'crown']
  const options = {
    say: 'Here the cap ends on the armhole',
    uses: names,
    through,
    stepKind: 'solve',
  } as const
  sleeve.place('frontEnd', ends.front, options)
  sleeve.place('backEnd', { x: -ends.back.x, y: ends.back.y }, options)
  sleeve.go('hemLevel', 'crown', 'down', 'capLength', {
    say: 'From the top come down to below both ends',
    drag: ['capDeeper'],
  })
  pen.tag({
    piece: 'sleeve',
    from: 'crown',
    to: 'hemLevel',
    label: 'Cap length',
    value: 'capDeeper',
    over: pen.value('capBelow'),
  })
  outline(sleeve, halves, names, through)
  sleeve.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  const long = sleeve.at('hemLevel').y
  sleeve.grain({ x: 0, y: long * 0.3 }, { x: 0, y: long * 0.8 })
  sew(pen, sleeve, { front, back }, covered, ease)
  bindUnderarm(pen, { front, back }, covered, armhole)
  const hem = sleeve.edge('hem').path
  pen.fit(
    fitAcross('sleeve-hem', 'shown', 0, undefined, [
      { piece: 'sleeve', path: hem, times: 1, length: pathLength(hem) },
    ]),
  )
  const down = straight(sleeve.at('crown'), sleeve.at('hemLevel'))
  pen.fit(
    fitAcross('sleeve-length', 'shown', 0, pen.value('armLength'), [
      { piece: 'sleeve', path: down, times: 1, length: pathLength(down) },
    ]),
  )
}

/** The upper parts of both halves of a plain head, drawn to the right. */
function capHalves(pen: Pen, sleeve: PiecePen, head: Halves, parts: Halves): { front: Path; back: Path } {
  const crown = sleeve.at('crown')
  const back = sleeve.at('backUnderarm')
  const level = { x: 1, y: 0 }
  const whole = {
    front: fitHead(crown, sleeve.at('frontUnderarm'), level, head.front, frontFullness),
    back: fitHead(crown, { x: -back.x, y: back.y }, level, head.back, backFullness),
  }
  if (!whole.front || !whole.back) {
    pen.refuse({
      field: 'sleeveEase',
      code: 'impossible-shape',
      message:
        'The head of this cap cannot be drawn to its armhole. Give the sleeve less ease round the arm.',
    })
  }
  return { front: slicePath(whole.front, 0, parts.front), back: slicePath(whole.back, 0, parts.back) }
}

function outline(
  sleeve: PiecePen,
  halves: { front: Path; back: Path },
  uses: readonly string[],
  through: readonly string[],
): void {
  const head = { role: 'armhole', allowance: 'armholeAllowance', uses, through } as const
  sleeve.curve('head-back', reversePath(transformPath(mirrorX, halves.back)), 'backEnd', 'crown', {
    ...head,
    say: 'Draw the back of the head as far as the cap goes',
  })
  sleeve.curve('head-front', halves.front, 'crown', 'frontEnd', {
    ...head,
    say: 'Draw the front of the head as far as the cap goes',
  })
  sleeve.curve(
    'hem',
    capHem(sleeve.at('frontEnd'), sleeve.at('hemLevel'), sleeve.at('backEnd')),
    'frontEnd',
    'backEnd',
    {
      role: 'hem',
      allowance: 'sleeveHemAllowance',
      say: 'Draw the hem in one sweep from end to end',
      through: ['hemLevel'],
    },
  )
}

/** One sweep from end to end through the lowest point, level there. */
function capHem(front: Point, lowest: Point, back: Point): Path {
  const level = { x: -1, y: 0 }
  const towards = (end: Point, way: 1 | -1): Point => {
    const fall = 1.8 * (lowest.y - end.y)
    const long = Math.hypot(end.x, fall)
    return { x: (-end.x / long) * way, y: (fall / long) * way }
  }
  const right = fairCurve(front, towards(front, 1), lowest, level)
  const left = fairCurve(lowest, level, back, towards(back, -1))
  return { closed: false, segments: [...(right?.segments ?? []), ...(left?.segments ?? [])] }
}

function sew(
  pen: Pen,
  sleeve: PiecePen,
  into: { readonly front: Armhole; readonly back: Armhole },
  covered: Halves,
  ease: Halves,
): void {
  for (const side of ['front', 'back'] as const) {
    pen.sew({
      id: `armhole-${side}`,
      name: `Sleeve into ${side} armhole`,
      a: [{ piece: 'sleeve', edge: `head-${side}`, ...(side === 'back' ? { reversed: true } : {}) }],
      b: armholeStretch(into[side], 0, covered[side]),
      join: 'eased',
      easeFrom: smoothEase[side],
      // The ends lie flat too: what is eased lies between.
      matches: [
        { a: 20, b: 20 },
        { a: covered[side] + ease[side] - 15, b: covered[side] - 15 },
      ],
      ticks: side === 'front' ? 1 : 2,
    })
  }
  sleeve.notch('crown', 'head-front', 0)
}
