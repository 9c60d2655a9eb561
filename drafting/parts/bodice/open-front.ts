import type { Path, Point } from '../../contract'
import { applyTo, endOf, startOf, startTangent, transformPath, unit } from '../../geometry'
import type { Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import { pinned } from '../fitted-waist'
import { chosenNeckline, leaning } from '../necklines'
import { princessPlace, type BustDart } from './bust-darts'
import type { Lean } from './half'
import { framesOf, tipOf, type Frames, type FrontBlock, type Opening, type UpperEdge } from './open-darts'
import { mouthOf, soundOpenings } from './places'

/** A front before its bust darts are opened. */
export interface ClosedFront {
  /** The side seam down from the closed underarm, and what it follows from. */
  readonly side: Path
  readonly uses: Mask
  readonly darts: readonly BustDart[]
  /** The point of the dart at the waist, which takes a bust dart that opens there. */
  readonly waistPoint: Point
  readonly lean: Lean
  /** Why the underarm cannot be corrected, where the side seam is no straight line that could follow it. */
  readonly fixed?: string
}

/**
 * Finds how the bust darts of a front open and marks their points, the underarm swung up by them, and the hollow of the
 * armhole, in the order in which a drafter comes to them.
 *
 * @param front with the marks of `bodiceFrontMarks`.
 */
export function openFront(
  pen: Pen,
  front: PiecePen,
  closed: ClosedFront,
): { readonly frames: Frames; readonly uses: Mask } {
  const plan = pen.follow(() => {
    pen.heed(closed.uses)
    const block = blockOf(pen, front, closed)
    return { block, openings: soundOpenings(pen, block) }
  })
  const { block, openings } = plan.made
  const frames = framesOf(block, placeTips(front, openings, plan.uses))
  front.place('underarm', applyTo(frames.swing, front.at('underarmClosed')), {
    say: 'Swing the side up about the point of the dart by its angle',
    mask: plan.uses,
    through: ['underarmClosed', 'bustPoint'],
    stepKind: 'turn',
    ...(closed.fixed ? { fixed: closed.fixed } : {}),
  })
  placeHollow(front)
  checkRoom(pen, front)
  return { frames, uses: plan.uses }
}

function blockOf(pen: Pen, front: PiecePen, { side, darts, waistPoint, lean }: ClosedFront): FrontBlock {
  const bust = front.at('bustPoint')
  const atWaist = darts.find((plan) => plan.place === 'waist')
  const neckline = necklineOf(pen, front, lean)
  return {
    bust,
    short: princessPlace(pen) ? 0 : pen.length('dartShort'),
    mouths: darts.flatMap((plan) => mouthOf(pen, plan, bust.y) ?? []),
    waist: { degrees: atWaist?.degrees ?? 0, point: waistPoint },
    centre: straight(front.at('centreNeck'), front.at('centreWaist')),
    outline: (swing) => {
      const swung = transformPath(swing, side)
      const hollow = {
        x: pen.length('frontHalf'),
        y: (front.at('shoulderTip').y + startOf(swung).y) / 2,
      }
      return upperEdges(front, neckline, hollow, swung)
    },
  }
}

/** The outline from the neck to the end of the side, swung up as the marks of the front stand. @param side not yet swung */
export function swungOutline(
  pen: Pen,
  front: PiecePen,
  side: Path,
  frames: Frames,
  lean: Lean,
): readonly [UpperEdge, UpperEdge, UpperEdge, UpperEdge] {
  const end = applyTo(frames.swing, endOf(side))
  const swung = pinned(transformPath(frames.swing, side), front.at('underarm'), end)
  return upperEdges(front, necklineOf(pen, front, lean), front.at('hollow'), swung)
}

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
  const shoulder = unit(between(front.at('sideNeck'), tip))
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
