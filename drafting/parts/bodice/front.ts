import type { Point, Run } from '../../contract'
import { applyTo, distance, pathLength, rotation, startTangent, towards, unit } from '../../geometry'
import type { Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { armholeCurve } from '../armhole'
import type { BodiceWay } from '.'
import { openDart, type PlacedEdge, type UpperEdge } from './bust-dart'
import { drawWaist, fitWaist, pinned, waistDarts, type FittedWaist } from '../fitted-waist'
import type { Faced } from '../facing'
import { chosenNeckline, leaning } from '../necklines'
import { lapFront } from '../openings/button-band'
import { onFold, type Centre } from '../openings/opening'

/** Where the bust dart may open: the edge, and how far along: a share of it, or a named length. */
const places: Readonly<
  Record<string, { readonly edge: string; readonly share?: number; readonly by?: string }>
> = {
  side: { edge: 'side', by: 'dartBelowArmhole' },
  shoulder: { edge: 'shoulder', share: 0.5 },
  armhole: { edge: 'armhole', share: 0.6 },
  neck: { edge: 'neckline' },
}

/** The front of a fitted bodice, and what the other pieces need of it. */
export interface BodiceFront {
  readonly faced: Faced
  /** The edges that each edge of the outline consists of, in order: a dart divides the one that it opens on. */
  readonly runs: (edge: string) => Run[]
  /** Its waist edges from the side to the centre, as they are drawn. */
  readonly waist: readonly string[]
  readonly centre: Centre
}

/** Marks of neck, shoulder, bust and levels, in drafting order. */
export function bodiceFrontMarks(pen: Pen, front: PiecePen): void {
  const { depth, widening } = chosenNeckline(pen)
  front.start('neckLevel', { x: 0, y: 0 }, 'Fold the cloth; mark the level of the side neck on the centre')
  front.go('neckPoint', 'neckLevel', 'right', 'frontNeckWidth', {
    say: 'Go across the width of the front neck',
    round: 'up',
  })
  front.go('centreNeck', 'neckLevel', 'down', depth, {
    say: 'Come down the depth of the front neck',
    drag: ['frontNeckDrop'],
  })
  pen.tag({
    piece: 'front',
    from: 'neckLevel',
    to: 'centreNeck',
    label: 'Neck depth',
    value: 'frontNeckDrop',
    over: pen.length(depth) - pen.value('frontNeckDrop'),
  })
  const shoulder = towards(pen.value('frontSlope'))
  front.aim('shoulderTip', 'neckPoint', shoulder, pen.length('frontShoulder'), {
    say: 'Down the slope go the length of the shoulder',
    by: 'frontShoulder',
    uses: ['frontSlope'],
    drag: ['frontSlope'],
  })
  front.aim('sideNeck', 'neckPoint', shoulder, pen.length(widening), {
    say: 'Open the neck along the shoulder',
    by: widening,
    uses: ['frontSlope'],
    drag: ['neckWidening'],
  })
  pen.tag({
    piece: 'front',
    from: 'neckPoint',
    to: 'sideNeck',
    label: 'Neck wider by',
    value: 'neckWidening',
    over: pen.length(widening) - pen.value('neckWidening'),
  })
  front.go('bustLevel', 'neckLevel', 'down', 'bustHeight', { say: 'Come down the bust height' })
  front.go('bustPoint', 'bustLevel', 'right', 'bustPointOut', {
    say: 'Go across half the bust span: here is the bust point',
    kind: 'drill',
  })
  front.go('scyeLevel', 'neckLevel', 'down', 'frontScye', { say: 'Come down to the level of the underarm' })
  front.go('underarmClosed', 'scyeLevel', 'right', 'frontQuarter', {
    say: 'Go across a quarter of the bust with its ease: the underarm while the bust dart is closed',
    drag: ['bustEase'],
  })
  front.go('centreWaist', 'neckLevel', 'down', 'frontWaistLength', {
    say: 'Come down the front waist length',
  })
}

/**
 * Draws the front: the waist first, which tells where the side goes, then the upper outline with the side swung up by the
 * bust dart, and the dart opened at its place.
 *
 * @param seam length of the back's side seam, mm, which the front's must have.
 * @param lean how the neckline leaves the side neck.
 */
export function drawBodiceFront(
  pen: Pen,
  front: PiecePen,
  seam: number,
  lean: number,
  way: BodiceWay,
): BodiceFront {
  const at = (id: string): Point => front.at(id)
  const bust = at('bustPoint')
  const names = [
    'bustDartAngle',
    'frontWaistHalf',
    'frontDart',
    'waistTip',
    'frontQuarter',
    'frontScye',
    'sideShare',
  ]
  const waistTip = bust.y + pen.length('waistTip')
  const darts = waistDarts(bust.x, waistTip, at('centreWaist').y, pen.value('frontDart'))
  const centre = { at: at('centreWaist'), leaves: { x: 1, y: 0 } }
  const waist = fitWaist(
    pen,
    centre,
    at('underarmClosed'),
    { length: seam },
    darts,
    pen.value('frontWaistHalf'),
  )

  const place = places[String(pen.chosen('dartTo'))]
  const angle = pen.value('bustDartAngle')
  const upper = swungOutline(pen, front, waist, lean, place, angle)
  const along = place && mouthAlong(pen, upper.edges, place)
  const opened = openDart(
    upper.edges,
    place && along !== undefined ? { edge: place.edge, along } : undefined,
    upper.point,
    angle,
  )

  const sideWaist = opened.beyond ? waist.side : (upper.edges.at(-1)?.path.segments.at(-1)?.to as Point)
  front.place('sideWaistEnd', sideWaist, { say: 'Mark the waist on the side', uses: names })
  drawOutline(front, opened.edges, upper.point, names)
  const turned = opened.beyond ? waist : swingWaist(waist, upper.point, -angle)
  const ends = { centre: 'centreWaist', side: 'sideWaistEnd' }
  const waistEdges = drawWaist(front, turned, ends, false, names, way.waist)
  const half = {
    piece: front,
    foot: 'centreWaist',
    below: { edge: 'waist', role: 'waist', allowance: 'waistAllowance', finish: way.waist },
  } as const
  if (way.buttons) lapFront(pen, half)
  else onFold(half)

  const [neckline, , armhole, side] = upper.edges as [UpperEdge, UpperEdge, UpperEdge, UpperEdge]
  return {
    faced: {
      piece: front,
      neckline: neckline.path,
      armhole: armhole.path,
      side: startTangent(side.path),
      uses: pen.usesOf(names),
    },
    runs: (edge) =>
      opened.edges.filter((one) => one.of === edge).map((one) => ({ piece: 'front', edge: one.id })),
    waist: waistEdges,
    centre: way.buttons ? { kind: 'lap', below: half.below } : { kind: 'fold' },
  }
}

/** The outline from the neck to the side waist, with everything beyond the bust swung up about the dart's point. */
function swungOutline(
  pen: Pen,
  front: PiecePen,
  waist: FittedWaist,
  lean: number,
  place: (typeof places)[string] | undefined,
  angle: number,
): { readonly edges: readonly UpperEdge[]; readonly point: Point } {
  const at = (id: string): Point => front.at(id)
  const bust = at('bustPoint')
  const closed = at('underarmClosed')
  const point = dartPoint(pen, front, waist, place)
  const swing = rotation(-angle, point)
  const underarm = applyTo(swing, closed)
  front.place('underarm', underarm, {
    say: 'Swing the side up about the point of the dart by its angle',
    uses: ['bustDartAngle', 'dartShort'],
    through: ['underarmClosed', 'bustPoint'],
    stepKind: 'turn',
  })
  const shoulder = unit(between(at('neckPoint'), at('shoulderTip')))
  const sideWaist = applyTo(swing, waist.side)
  const side = unit(between(underarm, sideWaist))
  front.place(
    'halfDepth',
    { x: 0, y: (at('shoulderTip').y + underarm.y) / 2 },
    { say: 'Half way down the armhole', through: ['shoulderTip', 'underarm'] },
  )
  front.go('hollow', 'halfDepth', 'right', 'frontHalf', {
    say: 'Go across half the front: the hollow of the armhole',
  })
  const shape = chosenNeckline(pen)
  if (at('hollow').x > underarm.x - 15 || bust.x > underarm.x - 20) {
    pen.refuse({
      field: 'acrossFront',
      code: 'impossible-shape',
      message:
        'Across the front the body is wider than this bust allows. Measure across front and bust again, or give more bust ease.',
      max: 2 * (underarm.x - 15),
    })
  }
  return {
    point,
    edges: [
      { id: 'neckline', path: shape.draw(at('centreNeck'), at('sideNeck'), leaning(lean)) },
      { id: 'shoulder', path: straight(at('sideNeck'), at('shoulderTip')) },
      { id: 'armhole', path: armholeCurve(at('shoulderTip'), at('hollow'), underarm, shoulder, side) },
      { id: 'side', path: straight(underarm, sideWaist) },
    ],
  }
}

/** The dart stops short of the bust point, on the way to its mouth. */
function dartPoint(
  pen: Pen,
  front: PiecePen,
  waist: FittedWaist,
  place: (typeof places)[string] | undefined,
): Point {
  const bust = front.at('bustPoint')
  if (!place) return waist.darts[0]?.point ?? { x: bust.x, y: bust.y + pen.length('waistTip') }
  const shoulder = {
    x: (front.at('sideNeck').x + front.at('shoulderTip').x) / 2,
    y: (front.at('sideNeck').y + front.at('shoulderTip').y) / 2,
  }
  const closed = front.at('underarmClosed')
  const down = unit(between(closed, waist.side))
  const below = pen.length('dartBelowArmhole')
  const towardsMouth: Readonly<Record<string, Point>> = {
    side: { x: closed.x + down.x * below, y: closed.y + down.y * below },
    shoulder,
    armhole: { x: pen.length('frontHalf'), y: (front.at('shoulderTip').y + closed.y) / 2 },
    neckline: { x: front.at('sideNeck').x * 0.7, y: front.at('centreNeck').y * 0.7 },
  }
  const mouth = towardsMouth[place.edge] as Point
  const long = distance(bust, mouth)
  const short = Math.min(pen.length('dartShort'), long * 0.4)
  return { x: bust.x + ((mouth.x - bust.x) * short) / long, y: bust.y + ((mouth.y - bust.y) * short) / long }
}

function mouthAlong(pen: Pen, edges: readonly UpperEdge[], place: (typeof places)[string]): number {
  const edge = edges.find((one) => one.id === place.edge) as UpperEdge
  const share = place.edge === 'neckline' ? chosenNeckline(pen).dartAt : place.share
  return place.by ? pen.length(place.by) : pathLength(edge.path) * (share ?? 0.5)
}

/** The waist of a front whose bust dart is at the waist: the side part swings with the side. */
function swingWaist(waist: FittedWaist, about: Point, degrees: number): FittedWaist {
  const swing = rotation(degrees, about)
  const [inner, ...outer] = waist.waist.stretches
  return {
    ...waist,
    side: applyTo(swing, waist.side),
    darts: waist.darts.map((dart, index) =>
      index === 0 ? dart : { ...dart, point: applyTo(swing, dart.point) },
    ),
    waist: { ...waist.waist, stretches: [inner!, ...outer.map((path) => turnPath(path, swing))] },
  }
}

const turnPath = (path: BodicePath, swing: ReturnType<typeof rotation>): BodicePath => ({
  closed: path.closed,
  segments: path.segments.map((segment) =>
    segment.kind === 'line'
      ? { kind: 'line', from: applyTo(swing, segment.from), to: applyTo(swing, segment.to) }
      : {
          kind: 'cubic',
          from: applyTo(swing, segment.from),
          control1: applyTo(swing, segment.control1),
          control2: applyTo(swing, segment.control2),
          to: applyTo(swing, segment.to),
        },
  ),
})
type BodicePath = FittedWaist['waist']['stretches'][number]

const roles = {
  neckline: 'neckline',
  shoulder: 'seam',
  armhole: 'armhole',
  side: 'seam',
  dart: 'dart',
} as const
const allowances: Readonly<Record<string, string>> = {
  neckline: 'neckAllowance',
  shoulder: 'shoulderAllowance',
  armhole: 'armholeAllowance',
  side: 'sideAllowance',
}
const words: Readonly<Record<string, string>> = {
  neckline: 'Draw the front neckline',
  shoulder: 'Draw the shoulder',
  armhole: 'Draw the armhole: square off the shoulder, in to the hollow, round to the underarm',
  side: 'Draw the side seam',
  dart: 'Draw a leg of the bust dart to its point',
}

/** Puts the upper edges and the dart's legs on the piece, with a mark at every corner. */
function drawOutline(
  front: PiecePen,
  edges: readonly PlacedEdge[],
  point: Point,
  names: readonly string[],
): void {
  const start: Readonly<Record<string, string>> = {
    neckline: 'centreNeck',
    shoulder: 'sideNeck',
    armhole: 'shoulderTip',
    side: 'underarm',
  }
  front.place('bustDartPoint', point, {
    say: 'The point of the bust dart, short of the bust point',
    through: ['bustPoint'],
    uses: names,
  })
  let from = 'centreNeck'
  edges.forEach((edge, index) => {
    const end = edge.path.segments.at(-1)?.to as Point
    const next = edges[index + 1]
    const known = next && start[next.id]
    let to = !next
      ? 'sideWaistEnd'
      : next.of === 'dart' && edge.of === 'dart'
        ? 'bustDartPoint'
        : `end-${edge.id}`
    if (known && distance(front.at(known), end) < 1e-6) to = known
    if (!front.marks.has(to)) front.place(to, end, { say: 'Mark where it ends', uses: names })
    front.curve(edge.id, pinned(edge.path, front.at(from), front.at(to)), from, to, {
      role: roles[edge.of as keyof typeof roles],
      ...(allowances[edge.of] ? { allowance: allowances[edge.of] as string } : {}),
      say: words[edge.of] as string,
      kind: edge.of === 'neckline' || edge.of === 'armhole' ? 'curve' : 'line',
      uses: names,
    })
    from = to
  })
  if (edges.some((edge) => edge.of === 'dart')) {
    front.dart('bust-dart', ['bust-dart-upper', 'bust-dart-lower'], point, 'down')
  }
}
