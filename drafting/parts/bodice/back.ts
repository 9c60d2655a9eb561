import type { Point } from '../../contract'
import {
  cubic,
  distance,
  identity,
  openPath,
  pathLength,
  pointAt,
  slicePath,
  startTangent,
  unit,
} from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import { fitWaist, pinned, waistDarts, waistTo } from '../fitted-waist'
import { backNeckline, leaning } from '../necklines'
import { takenInOf, throughTakenIn, type TakenIn } from '../taken-in'
import { dartAngle, type WaistDart } from '../waist-darts'
import type { BodiceWay } from '.'
import { princessPlace } from './bust-darts'
import { grainBesideCentre, placeWaistTips, type BodiceHalf, type Lean } from './half'
import { openUpper, type Opening, type UpperEdge } from './open-darts'
import { waistEdges } from './outline'
import { drawHalf } from './panels'
import { mouthOf } from './places'

/** A side seam as the other half must match it: the length by rule, mm, and where corrections take it in. */
export interface SideSeam {
  readonly chord: number
  readonly taken: readonly TakenIn[]
  readonly uses: Mask
}

/** A side seam of a bodice may be taken in down to its end, and its end with it, mm. */
const beyondEnd = -40

/** Draws the back from its marks: the waist fitted first, then neck, shoulder, armhole, side, waist and centre. */
export function drawBodiceBack(
  pen: Pen,
  back: PiecePen,
  lean: Lean,
  way: BodiceWay,
): BodiceHalf & { readonly side: SideSeam } {
  const at = (id: string): Point => back.at(id)
  back.go('centreWaist', 'waistLevel', 'right', 'centreBackIn', { say: 'Come in at the centre back' })
  const planned = pen.follow(() => dartsOf(pen, back))
  const darts = placeWaistTips(back, planned.made, at('waistLevel').y, planned.uses)
  const fitted = pen.follow(() => {
    pen.heed(planned.uses)
    const centre = centreOf(back)
    const place = { level: at('waistLevel').y }
    const half = pen.value('backWaistHalf')
    return { centre, fit: fitWaist(pen, centre, at('underarm'), place, darts, half) }
  })
  back.place('sideWaist', fitted.made.fit.side, {
    say: 'Mark the waist on the side, found so that the waist fits',
    mask: fitted.uses,
    stepKind: 'solve',
  })
  back.place(
    'halfDepth',
    { x: 0, y: (at('shoulderTip').y + at('underarm').y) / 2 },
    { say: 'Half way down the armhole', through: ['shoulderTip', 'underarm'] },
  )
  back.go('hollow', 'halfDepth', 'right', 'backHalf', {
    say: 'Go across half the back: the hollow of the armhole',
  })
  checkBackRoom(pen, back)
  const drawn = pen.follow(() => {
    const [top, end] = [at('underarm'), at('sideWaist')]
    const taken = takenInOf(pen, 'side', top, end, beyondEnd)
    const { path } = throughTakenIn(top, end, taken)
    pen.heed(lean.uses)
    const shoulder = unit(between(at('sideNeck'), at('shoulderTip')))
    const upper: readonly [UpperEdge, UpperEdge, UpperEdge, UpperEdge] = [
      { id: 'neckline', path: backNeckline(at('centreNeck'), at('sideNeck'), leaning(lean.degrees)) },
      { id: 'shoulder', path: straight(at('sideNeck'), at('shoulderTip')) },
      {
        id: 'armhole',
        path: armholeCurve(at('shoulderTip'), at('hollow'), top, shoulder, startTangent(path)),
      },
      { id: 'side', path },
    ]
    const waist = waistTo(pen, fitted.made.centre, path, fitted.made.fit)
    return { upper, waist, side: { chord: distance(top, end), taken } }
  })
  const { upper, waist, side } = drawn.made
  const uses = fitted.uses | drawn.uses
  const princess = princessPlace(pen)
  const edges = [
    ...openUpper(upper, { ...closed, upper: seamOf(pen, waist.darts) }),
    ...waistEdges(waist, { side: 'sideWaist', centre: 'centreWaist' }, () => identity),
  ]
  const half = drawHalf(pen, back, edges, {
    uses,
    waist: way.waist,
    end: 'centreWaist',
    ...(princess ? { princess: { from: princess, node: 'waistDart1Point', turned: 0 } } : {}),
  })
  grainBesideCentre(back)
  back.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  centreBack(pen, back, centreOf(back).down, uses, way)
  const [neckline, , armhole, down] = upper
  return {
    ...half,
    faced: {
      piece: back,
      neckline: neckline.path,
      armhole: armhole.path,
      side: startTangent(down.path),
      uses,
    },
    centre: { kind: way.buttons ? 'seam' : 'zip' },
    side: { ...side, uses },
  }
}

/** The waist dart of the back, or two; a princess seam swallows a single one. */
function dartsOf(pen: Pen, back: PiecePen): readonly WaistDart[] {
  const point = { x: back.at('underarm').x * 0.44, y: back.at('underarm').y }
  const waist = back.at('waistLevel').y
  const intake = pen.value('backDart')
  return princessPlace(pen)
    ? [{ point, angle: dartAngle(intake, waist - point.y) }]
    : waistDarts(point.x, point.y, waist, intake)
}

/** A back has no bust dart: a princess seam opens nothing above its waist dart. */
const closed = { centre: undefined, swing: identity, inner: identity, outer: identity }

function seamOf(pen: Pen, darts: readonly WaistDart[]): readonly Opening[] {
  const place = princessPlace(pen)
  const [tip] = darts
  if (!place || !tip) return []
  const mouth = mouthOf(pen, { id: 'princess', place, degrees: 0 }, 0)
  return mouth ? [{ ...mouth, point: tip.point, degrees: 0 }] : []
}

/** Refuses a back that is wider across than its underarm: its armhole would turn outwards. */
export function checkBackRoom(pen: Pen, back: PiecePen): void {
  const { x } = back.at('underarm')
  if (back.at('hollow').x <= x - 15) return
  pen.refuse({
    field: 'acrossBack',
    code: 'impossible-shape',
    message:
      'Across the back the body is wider than this bust allows. Measure across back and bust again, or give more bust ease.',
    max: 2 * (x - 15),
  })
}

/** Where the waist of the back starts, and the direction of the centre seam there. */
function centreOf(back: PiecePen) {
  const waist = back.at('centreWaist')
  const down = unit(between({ x: 0, y: (back.at('underarm').y + back.at('waistLevel').y) / 2 }, waist))
  return { at: waist, leaves: { x: down.y, y: -down.x }, down }
}

/** The centre back: straight to the level of the underarm, then in to the waist, where it meets it square. */
function centreBack(pen: Pen, back: PiecePen, down: Point, uses: Mask, way: BodiceWay): void {
  const waist = back.at('centreWaist')
  const neck = back.at('centreNeck')
  const bend = { x: 0, y: Math.max(neck.y + 20, back.at('underarm').y) }
  const long = waist.y - bend.y
  const whole = openPath([
    cubic(
      waist,
      { x: waist.x - (down.x * long) / 3, y: waist.y - (down.y * long) / 3 },
      { x: 0, y: bend.y + long * 0.33 },
      bend,
    ),
    { kind: 'line', from: bend, to: neck },
  ])
  const options = { allowance: 'centreBackAllowance', mask: uses }
  if (way.buttons) {
    back.curve('centre', whole, 'centreWaist', 'centreNeck', {
      role: 'seam',
      say: 'The centre back seam, closed from the neck to the waist',
      ...options,
    })
    sewCentre(pen)
    return
  }
  const runsOn = way.zip === 'runs on'
  const zip = runsOn ? pathLength(whole) : Math.min(pen.length('zipLength'), pathLength(whole))
  if (!runsOn) pen.notion({ kind: 'zip', length: zip, count: 1 })
  const below = pathLength(whole) - zip
  if (below < 25) {
    back.curve('opening', whole, 'centreWaist', 'centreNeck', {
      role: 'opening',
      say: 'The whole centre back opens',
      ...options,
    })
    return
  }
  back.place('zipEnd', pointAt(whole, below), {
    say: 'Mark the end of the zip',
    uses: ['zipLength'],
    mask: uses,
    drag: ['zipLength'],
  })
  back.curve(
    'centre',
    pinned(slicePath(whole, 0, below), waist, back.at('zipEnd')),
    'centreWaist',
    'zipEnd',
    { role: 'seam', say: 'The centre back seam below the zip', ...options },
  )
  back.curve(
    'opening',
    pinned(slicePath(whole, below, pathLength(whole)), back.at('zipEnd'), neck),
    'zipEnd',
    'centreNeck',
    { role: 'opening', say: 'The opening for the zip', ...options },
  )
  sewCentre(pen)
}

function sewCentre(pen: Pen): void {
  pen.sew({
    id: 'centre-back',
    name: 'Centre back',
    a: [{ piece: 'back', edge: 'centre' }],
    b: [{ piece: 'back', edge: 'centre', mirrored: true }],
  })
}
