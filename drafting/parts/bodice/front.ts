import type { Point } from '../../contract'
import { applyTo, distance, startTangent, undo } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { fitWaist, waistDarts, waistTo, type FittedWaist } from '../fitted-waist'
import { withKeyhole } from '../openings'
import { lapFront } from '../openings/button-band'
import { onFold, type Centre } from '../openings/opening'
import { throughTakenIn } from '../taken-in'
import { dartAngle, type WaistDart } from '../waist-darts'
import type { BodiceWay } from '.'
import type { SideSeam } from './back'
import { bustDarts, princessPlace, type BustDart } from './bust-darts'
import { centreEdges } from './centre-front'
import { openUpper } from './open-darts'
import { openFront, swungOutline } from './open-front'
import { grainBesideCentre, placeWaistTips, type BodiceHalf, type Lean } from './half'
import { waistEdges } from './outline'
import { drawHalf } from './panels'

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
  const fitted = pen.follow(() => {
    pen.heed(plans.uses | side.uses)
    return fitFront(pen, front, front.at('underarmClosed'), side, darts)
  })
  const { frames, uses: opened } = openFront(pen, front, {
    side: straight(front.at('underarmClosed'), fitted.made.side),
    uses: fitted.uses,
    darts: plans.made.bust,
    waistPoint: darts[0]?.point ?? front.at('bustPoint'),
    lean,
  })

  const lower = pen.follow(() => {
    pen.heed(opened | side.uses)
    const top = applyTo(undo(frames.swing), front.at('underarm'))
    const moved = distance(top, front.at('underarmClosed')) > 1e-6
    return { top, waist: moved ? fitFront(pen, front, top, side, darts) : fitted.made }
  })
  const { top } = lower.made
  front.place('sideWaistEnd', applyTo(frames.outer, lower.made.waist.side), {
    say: 'Mark the waist on the side',
    mask: opened | lower.uses,
    keeps: { from: applyTo(frames.outer, top), length: side.chord },
  })
  const drawn = pen.follow(() => {
    const end = applyTo(undo(frames.outer), front.at('sideWaistEnd'))
    const { path } = throughTakenIn(top, end, side.taken)
    const waist = waistTo(pen, centreOf(front), path, lower.made.waist)
    return { waist, upper: swungOutline(pen, front, path, frames, lean) }
  })
  const { waist, upper } = drawn.made
  const uses = opened | lower.uses | drawn.uses
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

const fitFront = (
  pen: Pen,
  front: PiecePen,
  top: Point,
  side: SideSeam,
  darts: readonly WaistDart[],
): FittedWaist =>
  fitWaist(pen, centreOf(front), top, { length: side.chord }, darts, pen.value('frontWaistHalf'))
