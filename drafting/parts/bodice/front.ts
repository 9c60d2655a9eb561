import type { Path, Point } from '../../contract'
import { applyTo, distance, endOf, startOf, startTangent, transformPath, undo, unit } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import { fitWaist, pinned, waistDarts, waistTo, type FittedWaist } from '../fitted-waist'
import { chosenNeckline, leaning } from '../necklines'
import { withKeyhole } from '../openings'
import { lapFront } from '../openings/button-band'
import { onFold, type Centre } from '../openings/opening'
import { throughTakenIn } from '../taken-in'
import { dartAngle, type WaistDart } from '../waist-darts'
import type { BodiceWay } from '.'
import type { SideSeam } from './back'
import { bustDarts, princessPlace, type BustDart } from './bust-darts'
import { centreEdges } from './centre-front'
import { framesOf, openUpper, tipOf, type FrontBlock, type Opening, type UpperEdge } from './open-darts'
import { grainBesideCentre, placeWaistTips, type BodiceHalf, type Lean } from './half'
import { waistEdges } from './outline'
import { drawHalf } from './panels'
import { mouthOf, soundOpenings } from './places'

/**
 * Draws the front of a bodice: it finds how its bust darts open, then draws the outline with the side swung up and opens
 * them. The waist is fitted so that its darts closed it has its length and the side seam that of the back.
 *
 * @param side the back's side seam, whose length the front's must have.
 * @param lean how the neckline leaves the side neck.
 */
export function drawBodiceFront(
  pen: Pen,
  front: PiecePen,
  side: SideSeam,
  lean: Lean,
  way: BodiceWay,
): BodiceHalf {
  const plans = pen.follow(() => {
    const bust = bustDarts(pen, way.buttons ?? false)
    return { bust, waist: dartsOf(pen, front, bust) }
  })
  const darts = princessPlace(pen)
    ? plans.made.waist
    : placeWaistTips(front, plans.made.waist, front.at('centreWaist').y, plans.uses)
  const plan = pen.follow(() => {
    pen.heed(plans.uses)
    return planFront(pen, front, side, lean, plans.made.bust, darts)
  })
  const { block, openings } = plan.made
  const frames = framesOf(block, placeTips(front, openings, plan.uses))
  front.place('underarm', applyTo(frames.swing, front.at('underarmClosed')), {
    say: 'Swing the side up about the point of the dart by its angle',
    mask: plan.uses,
    through: ['underarmClosed', 'bustPoint'],
    stepKind: 'turn',
  })
  placeHollow(front)
  checkRoom(pen, front)

  const lower = pen.follow(() => {
    pen.heed(plan.uses | side.uses)
    const top = applyTo(undo(frames.swing), front.at('underarm'))
    const { waist } = plan.made
    const moved = distance(top, front.at('underarmClosed')) > 1e-6
    return { top, waist: moved ? fitFront(pen, front, top, side, waist.darts) : waist }
  })
  const { top } = lower.made
  front.place('sideWaistEnd', applyTo(frames.outer, lower.made.waist.side), {
    say: 'Mark the waist on the side',
    mask: plan.uses | lower.uses,
    keeps: { from: applyTo(frames.outer, top), length: side.chord },
  })
  const drawn = pen.follow(() => {
    const end = applyTo(undo(frames.outer), front.at('sideWaistEnd'))
    const { path } = throughTakenIn(top, end, side.taken)
    const waist = waistTo(pen, centreOf(front), path, lower.made.waist)
    const swung = pinned(
      transformPath(frames.swing, path),
      front.at('underarm'),
      applyTo(frames.swing, endOf(path)),
    )
    return { waist, upper: upperEdges(front, necklineOf(pen, front, lean), front.at('hollow'), swung) }
  })
  const { waist, upper } = drawn.made
  const uses = plan.uses | lower.uses | drawn.uses
  const edges = [
    ...openUpper(upper, frames),
    ...waistEdges(waist, { side: 'sideWaistEnd', centre: 'centreWaist' }, (stretch) =>
      stretch === 0 ? frames.inner : frames.outer,
    ),
    ...centreEdges(front, frames),
  ]
  const princess = princessPlace(pen)
  const half = drawHalf(pen, front, edges, {
    uses,
    waist: way.waist,
    ...(frames.centre ? {} : { end: 'centreWaist' }),
    ...(princess
      ? { princess: { from: princess, node: 'bustPoint', turned: pen.value('bustDartAngle') } }
      : {}),
  })
  const centre = frames.centre ? sewCentreFront(pen, front) : openCentre(pen, front, way)
  const [neckline, , armhole, down] = upper
  return {
    ...half,
    centre,
    faced: {
      piece: front,
      neckline: neckline.path,
      armhole: armhole.path,
      side: startTangent(down.path),
      uses,
    },
  }
}

/** The front on the fold, or lapped over and buttoned. */
function openCentre(pen: Pen, front: PiecePen, way: BodiceWay): Centre {
  const below = { edge: 'waist', role: 'waist', allowance: 'waistAllowance', finish: way.waist } as const
  const half = { piece: front, foot: 'centreWaist', below }
  if (way.buttons) lapFront(pen, half)
  else onFold(half)
  grainBesideCentre(front)
  front.cut({
    cloth: 'main',
    count: way.buttons ? 2 : 1,
    onFold: !way.buttons,
    handed: way.buttons ?? false,
  })
  return withKeyhole(pen, front, way.buttons ? { kind: 'lap', below } : { kind: 'fold' })
}

/** The front sewn at the centre, where a dart opens there; its neckline can still be faced on the fold. */
function sewCentreFront(pen: Pen, front: PiecePen): Centre {
  front.grain({ x: 35, y: front.at('centreNeck').y + 30 }, { x: 35, y: front.at('bustLevel').y - 10 })
  front.cut({ cloth: 'main', count: 2, onFold: false, handed: true })
  for (const edge of ['centre', 'centre-below'])
    pen.sew({
      id: `${edge}-front`,
      name: edge === 'centre' ? 'Centre front above the dart' : 'Centre front below the dart',
      a: [{ piece: 'front', edge }],
      b: [{ piece: 'front', edge, mirrored: true }],
    })
  withKeyhole(pen, front, { kind: 'seam' })
  return { kind: 'fold' }
}

const centreOf = (front: PiecePen) => ({ at: front.at('centreWaist'), leaves: { x: 1, y: 0 } })

/** The waist darts of the front; a princess seam swallows one that comes to the bust point. */
function dartsOf(pen: Pen, front: PiecePen, plans: readonly BustDart[]): readonly WaistDart[] {
  const bust = front.at('bustPoint')
  const waist = front.at('centreWaist').y
  const intake = pen.value('frontDart')
  if (princessPlace(pen)) return [{ point: bust, angle: dartAngle(intake, waist - bust.y) }]
  const tip = bust.y + pen.length('waistTip')
  const darts = waistDarts(bust.x, tip, waist, intake)
  // Where the bust dart opens at the waist there is a dart, however little the waist takes in.
  return darts.length || !plans.some(({ place }) => place === 'waist')
    ? darts
    : [{ point: { x: bust.x, y: tip }, angle: 0 }]
}

/** Everything that the bust darts open by, drafted with the darts closed. */
function planFront(
  pen: Pen,
  front: PiecePen,
  side: SideSeam,
  lean: Lean,
  plans: readonly BustDart[],
  darts: readonly WaistDart[],
) {
  pen.heed(side.uses)
  const bust = front.at('bustPoint')
  const atWaist = plans.find((plan) => plan.place === 'waist')
  const closed = front.at('underarmClosed')
  const waist = fitFront(pen, front, closed, side, darts)
  const neckline = necklineOf(pen, front, lean)
  const block: FrontBlock = {
    bust,
    short: princessPlace(pen) ? 0 : pen.length('dartShort'),
    mouths: plans.flatMap((plan) => mouthOf(pen, plan, bust.y) ?? []),
    waist: { degrees: atWaist?.degrees ?? 0, point: darts[0]?.point ?? bust },
    centre: straight(front.at('centreNeck'), front.at('centreWaist')),
    outline: (swing) => {
      const underarm = applyTo(swing, closed)
      const hollow = { x: pen.length('frontHalf'), y: (front.at('shoulderTip').y + underarm.y) / 2 }
      return upperEdges(front, neckline, hollow, straight(underarm, applyTo(swing, waist.side)))
    },
  }
  return { block, waist, openings: soundOpenings(pen, block) }
}

const fitFront = (
  pen: Pen,
  front: PiecePen,
  top: Point,
  side: SideSeam,
  darts: readonly WaistDart[],
): FittedWaist =>
  fitWaist(pen, centreOf(front), top, { length: side.chord }, darts, pen.value('frontWaistHalf'))

function necklineOf(pen: Pen, front: PiecePen, lean: Lean): Path {
  pen.heed(lean.uses)
  return chosenNeckline(pen).draw(front.at('centreNeck'), front.at('sideNeck'), leaning(lean.degrees))
}

/** The outline from the neck to the waist with the side swung up. */
function upperEdges(
  front: PiecePen,
  neckline: Path,
  hollow: Point,
  side: Path,
): readonly [UpperEdge, UpperEdge, UpperEdge, UpperEdge] {
  const tip = front.at('shoulderTip')
  const shoulder = unit(between(front.at('neckPoint'), tip))
  return [
    { id: 'neckline', path: neckline },
    { id: 'shoulder', path: straight(front.at('sideNeck'), tip) },
    { id: 'armhole', path: armholeCurve(tip, hollow, startOf(side), shoulder, startTangent(side)) },
    { id: 'side', path: side },
  ]
}

/** Marks the points of the bust darts; a correction there takes its dart along. */
function placeTips(front: PiecePen, openings: readonly Opening[], uses: Mask): readonly Opening[] {
  return openings.map((one) => {
    if (one.dart.id === 'princess') return one
    const id = tipOf(one.dart.id)
    front.place(id, one.point, {
      say: 'The point of the bust dart, short of the bust point',
      through: ['bustPoint'],
      mask: uses,
    })
    return { ...one, point: front.at(id) }
  })
}

function placeHollow(front: PiecePen): void {
  const level = (front.at('shoulderTip').y + front.at('underarm').y) / 2
  front.place(
    'halfDepth',
    { x: 0, y: level },
    { say: 'Half way down the armhole', through: ['shoulderTip', 'underarm'] },
  )
  front.go('hollow', 'halfDepth', 'right', 'frontHalf', {
    say: 'Go across half the front: the hollow of the armhole',
  })
}

function checkRoom(pen: Pen, front: PiecePen): void {
  const { x } = front.at('underarm')
  if (front.at('hollow').x <= x - 15 && front.at('bustPoint').x <= x - 20) return
  pen.refuse({
    field: 'acrossFront',
    code: 'impossible-shape',
    message:
      'Across the front the body is wider than this bust allows. Measure across front and bust again, or give more bust ease.',
    max: 2 * (x - 15),
  })
}
