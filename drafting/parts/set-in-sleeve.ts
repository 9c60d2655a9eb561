import type { DesignValue, Path, Point, RuleDefinition, Run } from '../contract'
import { endOf, intersections, mirrorX, pathLength, reversePath, transformPath } from '../geometry'
import { lengthRule } from '../pen/garment'
import { count, length } from '../pen/design'
import { nothing, type Mask } from '../pen/masks'
import { fitAcross, type Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import { fairCurve } from './hem'
import { backFullness, frontFullness } from './sleeve-head'
import { fanOut } from './slash-and-spread'
import { fitHead, solveHead } from './solve-head'

const worn = { id: 'sleeve', is: ['plain', 'flared'] }
const flared = { id: 'sleeve', is: ['flared'] }

export const sleeveDesign: readonly DesignValue[] = [
  length('sleeveLength', 'Sleeve length', 'sleeve', { default: 350, min: 250, max: 700 }, worn),
  length('sleeveEase', 'Ease round the arm', 'sleeve', { default: 50, min: 40, max: 120 }, worn),
  length('sleeveHeadEase', 'Ease of the sleeve head', 'sleeve', { default: 10, min: 0, max: 40 }, worn),
  length(
    'sleeveTaper',
    'Taper of each side',
    'sleeve',
    { default: 15, min: 0, max: 60 },
    {
      id: 'sleeve',
      is: ['plain'],
    },
  ),
  count('sleeveCuts', 'Number of cuts', 'sleeve', { default: 4, min: 2, max: 8 }, flared),
  length('sleeveSpread', 'Spread at each cut', 'sleeve', { default: 40, min: 5, max: 80 }, flared),
  length('sleeveAllowance', 'Sleeve seam allowance', 'allowances', { default: 12.7, min: 0, max: 40 }, worn),
  length('sleeveHemAllowance', 'Sleeve hem', 'allowances', { default: 20, min: 0, max: 50 }, worn),
]

export const sleeveRules: readonly RuleDefinition[] = [
  lengthRule('biceps', 'Sleeve girth at the underarm', 'upperArm + sleeveEase'),
  lengthRule('leastArmhole', 'Least armhole for the arm', '(upperArm + sleeveEase) * 1.1'),
  lengthRule('frontHeadEase', 'Ease in the front of the head', 'sleeveHeadEase * 0.45'),
  lengthRule('backHeadEase', 'Ease in the back of the head', 'sleeveHeadEase * 0.55'),
]

/** Bounds of a sleeve head's height as a share of the armhole. Common practice: a shirt's is the lowest. */
const lowestHead = 0.18
const highestHead = 0.33

/** An armhole as a sleeve sees it: the edges that make it, from the shoulder to the underarm. */
export interface Armhole {
  readonly piece: PiecePen
  readonly edges: readonly string[]
}

/** The armhole of a piece that has it in one edge. */
export const wholeArmhole = (piece: PiecePen): Armhole => ({ piece, edges: ['armhole'] })

const lengthOf = ({ piece, edges }: Armhole): number =>
  edges.reduce((sum, edge) => sum + piece.lengthOf(edge), 0)
const usesOf = ({ piece, edges }: Armhole): Mask =>
  edges.reduce((mask, edge) => mask | piece.edge(edge).uses, nothing)
const runsOf = ({ piece, edges }: Armhole): Run[] => edges.map((edge) => ({ piece: piece.id, edge }))

/**
 * A sleeve set into the armholes of a front and a back: its head is solved so that each half has the length of its armhole
 * and its share of the ease. Flared, it is then cut from the hem to the head and spread.
 */
export function setInSleeve(pen: Pen, front: Armhole, back: Armhole): PiecePen {
  const sleeve = pen.piece('sleeve', 'Sleeve')
  const isFlared = pen.chosen('sleeve') === 'flared'
  const armhole = { front: lengthOf(front), back: lengthOf(back) }
  const head = {
    front: armhole.front + pen.value('frontHeadEase'),
    back: armhole.back + pen.value('backHeadEase'),
  }
  const uses = usesOf(front) | usesOf(back) | pen.usesOf(['biceps', 'frontHeadEase', 'backHeadEase'])
  const shape = solveShape(pen, armhole.front + armhole.back, head)

  pen.find('headHeight', shape.height, uses)
  pen.find('frontGirth', shape.front, uses)
  pen.find('backGirth', shape.back, uses)
  pen.find(
    'underarmLength',
    pen.length('sleeveLength') - pen.length('headHeight'),
    uses | pen.usesOf(['sleeveLength']),
  )
  if (pen.value('underarmLength') < 25) {
    pen.refuse({
      field: 'sleeveLength',
      code: 'impossible-shape',
      message: `The sleeve ends above the underarm. Make it at least ${pen.say(shape.height + 25)} long.`,
      min: shape.height + 25,
    })
  }

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
  sleeve.go('hemLevel', 'crown', 'down', 'sleeveLength', {
    say: 'From the top come down the sleeve length',
    drag: ['sleeveLength'],
  })
  pen.tag({ piece: 'sleeve', from: 'crown', to: 'hemLevel', label: 'Sleeve length', value: 'sleeveLength' })

  const ends = isFlared ? fanOut(pen, sleeve, head) : taper(pen, sleeve)
  drawSleeve(pen, sleeve, head, ends)
  sewSleeve(pen, sleeve, front, back, head, armhole)
  return sleeve
}

/** Ids of the four corners of a sleeve. */
export interface SleeveCorners {
  readonly front: string
  readonly back: string
  readonly frontHem: string
  readonly backHem: string
}

/** Height and widths of the head. A large armhole for a thin arm would stand up like a mushroom: the girth is then let out. */
function solveShape(
  pen: Pen,
  armhole: number,
  head: { front: number; back: number },
): { height: number; front: number; back: number } {
  const shapes = { front: frontFullness, back: backFullness }
  let girth = pen.value('biceps')
  let solved = solveHead(girth, head.front, head.back, shapes)
  // The front half is the shorter: it too must keep some width.
  const bound = Math.min(highestHead * armhole, 0.66 * Math.min(head.front, head.back))
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

/** A plain sleeve: each side comes in by the taper. */
function taper(pen: Pen, sleeve: PiecePen): SleeveCorners {
  const girth = Math.min(pen.length('frontGirth'), pen.length('backGirth')) - 55
  const narrowest = Math.max(0, Math.min(girth, pen.value('underarmLength') * 0.4))
  if (pen.length('sleeveTaper') > narrowest) {
    pen.refuse({
      field: 'sleeveTaper',
      code: 'impossible-shape',
      message: `So much taper is too much for this sleeve. Take in at most ${pen.say(narrowest)} a side.`,
      max: narrowest,
    })
  }
  for (const side of ['front', 'back'] as const) {
    sleeve.square(`${side}HemSquare`, `${side}Underarm`, 'hemLevel', {
      say: `Square down from the ${side} underarm to the hem`,
    })
    sleeve.go(`${side}Hem`, `${side}HemSquare`, side === 'front' ? 'left' : 'right', 'sleeveTaper', {
      say: 'Come in by the taper',
      drag: ['sleeveTaper'],
    })
  }
  pen.tag({ piece: 'sleeve', from: 'frontHem', to: 'frontHemSquare', label: 'Taper', value: 'sleeveTaper' })
  return { front: 'frontUnderarm', back: 'backUnderarm', frontHem: 'frontHem', backHem: 'backHem' }
}

const flip = (point: Point): Point => ({ x: -point.x, y: point.y })

/** The back half of a head is drawn as a front half and turned over. */
const turnedOver = (path: Path): Path => reversePath(transformPath(mirrorX, path))

function drawSleeve(
  pen: Pen,
  sleeve: PiecePen,
  head: { front: number; back: number },
  ends: SleeveCorners,
): void {
  const crown = sleeve.at('crown')
  const frontArrives = squareTo(sleeve.at(ends.front), sleeve.at(ends.frontHem))
  const backArrives = squareTo(flip(sleeve.at(ends.back)), flip(sleeve.at(ends.backHem)))
  const frontHalf = fitHead(crown, sleeve.at(ends.front), frontArrives, head.front, frontFullness)
  const backHalf = fitHead(flip(crown), flip(sleeve.at(ends.back)), backArrives, head.back, backFullness)
  if (!frontHalf || !backHalf) {
    const spread = pen.chosen('sleeve') === 'flared'
    pen.refuse({
      field: spread ? 'sleeveSpread' : 'sleeveTaper',
      code: 'impossible-shape',
      message: spread
        ? 'So much spread flattens the sleeve head until it no longer fits its armhole. Use fewer cuts or spread each less.'
        : 'So much taper twists the sleeve head until it no longer fits its armhole. Taper less.',
    })
  }
  const names = ['biceps', 'frontHeadEase', 'backHeadEase']
  const options = { through: [ends.front, ends.back, 'crown', ends.frontHem, ends.backHem], uses: names }
  sleeve.curve('head-back', turnedOver(backHalf), ends.back, 'crown', {
    role: 'armhole',
    allowance: 'armholeAllowance',
    say: 'Draw the back of the head: long and flat, the length of the back armhole and its ease',
    ...options,
  })
  sleeve.curve('head-front', frontHalf, 'crown', ends.front, {
    role: 'armhole',
    allowance: 'armholeAllowance',
    say: 'Draw the front of the head: fuller above, scooped deeper below',
    ...options,
  })
  sleeve.line('underarm-front', ends.front, ends.frontHem, {
    role: 'seam',
    allowance: 'sleeveAllowance',
    say: 'Join the front underarm to the hem',
  })
  sleeve.curve('hem', sleeveHem(pen, sleeve, ends), ends.frontHem, ends.backHem, {
    role: 'hem',
    allowance: 'sleeveHemAllowance',
    corner: 'turned',
    say: 'Draw the hem in one sweep, square to both underarm seams',
    through: ['hemLevel'],
  })
  sleeve.line('underarm-back', ends.backHem, ends.back, {
    role: 'seam',
    allowance: 'sleeveAllowance',
    corner: 'turned',
    say: 'Join the hem to the back underarm',
  })
  sleeve.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  const long = sleeve.at('hemLevel').y
  sleeve.grain({ x: 0, y: long * 0.35 }, { x: 0, y: long * 0.8 })
}

/** Square to an underarm seam, outwards: the direction in which the head reaches it. */
function squareTo(underarm: Point, hem: Point): Point {
  const long = Math.hypot(hem.x - underarm.x, hem.y - underarm.y)
  return { x: (hem.y - underarm.y) / long, y: -(hem.x - underarm.x) / long }
}

/** One sweep from the front seam over the centre to the back seam. */
function sleeveHem(pen: Pen, sleeve: PiecePen, ends: SleeveCorners): Path {
  const front = sleeve.at(ends.frontHem)
  const back = sleeve.at(ends.backHem)
  const leaves = squareTo(sleeve.at(ends.front), front)
  const arrives = squareTo(flip(sleeve.at(ends.back)), flip(back))
  const bowed = pen.chosen('sleeve') === 'flared'
  const centre = sleeve.at('hemLevel')
  const right = bowed ? fairCurve(front, { x: -leaves.x, y: -leaves.y }, centre, { x: -1, y: 0 }) : undefined
  const left = bowed ? fairCurve(centre, { x: -1, y: 0 }, back, { x: -arrives.x, y: arrives.y }) : undefined
  if (right && left) return { closed: false, segments: [...right.segments, ...left.segments] }
  const whole = fairCurve(front, { x: -leaves.x, y: -leaves.y }, back, { x: -arrives.x, y: arrives.y })
  if (!whole) {
    pen.refuse({
      field: bowed ? 'sleeveSpread' : 'sleeveTaper',
      code: 'impossible-shape',
      message: 'The hem of this sleeve cannot be drawn in one sweep. Spread or taper it less.',
    })
  }
  return whole
}

function sewSleeve(
  pen: Pen,
  sleeve: PiecePen,
  front: Armhole,
  back: Armhole,
  head: { front: number; back: number },
  armhole: { front: number; back: number },
): void {
  const whole = armhole.front + armhole.back
  const frontNotch = 0.17 * whole
  const backNotch = 0.21 * whole
  // No ease within 2 cm of the crown nor below the notches: there the cloth lies flat.
  pen.sew({
    id: 'armhole-front',
    name: 'Sleeve into front armhole',
    a: [{ piece: 'sleeve', edge: 'head-front' }],
    b: runsOf(front),
    join: 'eased',
    easeFrom: 'frontHeadEase',
    matches: [
      { a: 20, b: 20 },
      { a: head.front - frontNotch, b: armhole.front - frontNotch },
    ],
    ticks: 1,
  })
  pen.sew({
    id: 'armhole-back',
    name: 'Sleeve into back armhole',
    a: [{ piece: 'sleeve', edge: 'head-back', reversed: true }],
    b: runsOf(back),
    join: 'eased',
    easeFrom: 'backHeadEase',
    matches: [
      { a: 20, b: 20 },
      { a: head.back - backNotch, b: armhole.back - backNotch },
    ],
    ticks: 2,
  })
  pen.sew({
    id: 'sleeve-underarm',
    name: 'Sleeve underarm',
    a: [{ piece: 'sleeve', edge: 'underarm-front' }],
    b: [{ piece: 'sleeve', edge: 'underarm-back', reversed: true }],
    smooth: true,
  })
  sleeve.notch('crown', 'head-front', 0)
  const hemEdge = sleeve.edge('hem')
  lengthFit(pen, sleeve)
  const from = sleeve.edge('underarm-back')
  const across = straight(
    endOf(from.path),
    sleeve.edge('underarm-front').path.segments[0]?.from ?? { x: 0, y: 0 },
  )
  pen.fit(
    fitAcross('biceps', 'at-least', pen.value('sleeveEase'), pen.value('upperArm'), [
      { piece: 'sleeve', path: across, times: 1, length: pathLength(across) },
    ]),
  )
  pen.fit(
    fitAcross('sleeve-hem', 'shown', 0, undefined, [
      { piece: 'sleeve', path: hemEdge.path, times: 1, length: pathLength(hemEdge.path) },
    ]),
  )
}

/** The sleeve against the arm: from the crown straight down to the hem. */
function lengthFit(pen: Pen, sleeve: PiecePen): void {
  const crown = sleeve.at('crown')
  const deep = { x: crown.x, y: sleeve.at('hemLevel').y + 200 }
  const foot =
    intersections(sleeve.edge('hem').path, straight(crown, deep))[0]?.point ?? sleeve.at('hemLevel')
  const path = straight(crown, { x: crown.x, y: foot.y })
  pen.fit(
    fitAcross('sleeve-length', 'shown', 0, pen.value('armLength'), [
      { piece: 'sleeve', path, times: 1, length: pathLength(path) },
    ]),
  )
  const over = pathLength(path) - pen.value('armLength')
  if (over > 30) {
    pen.caution(
      'sleeve-long',
      `The sleeve is ${pen.say(over)} longer than the arm. Shorten it, or let it gather at the wrist.`,
      'sleeveLength',
      'armLength',
    )
  }
}
