import type { Path, Point } from '../../contract'
import {
  add,
  cubic,
  endOf,
  endTangent,
  intersections,
  joinPaths,
  mirrorX,
  openPath,
  reversePath,
  scale,
  startOf,
  startTangent,
  subtract,
  transformPath,
  unit,
} from '../../geometry'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { pinned } from '../fitted-waist'
import { fairCurve } from '../hem'
import { takeIn, type TakenIn } from '../take-in'
import { hemFollows } from './marks'
import { seamsOfEdge } from './panels'
import { sewnToBodice, skirtPiece, waistFinish, type SkirtUse } from './skirt'

const waistUses = ['goreWaist', 'goreHalfHip', 'hipLine']
const hemUses = ['goreHalfHip', 'hipLine', 'length', 'flareDrawn', 'flareFrom']
const mirrored = ({ x, y }: Point): Point => ({ x: -x, y })
const alike = 'All gores are alike on both edges: move the point on the right edge instead.'

/** One of so many gores. */
interface Gore {
  readonly id: string
  readonly name: string
  readonly index: number
  readonly gores: number
}

/** A gore, the mirror image of itself about its middle unless a seam of it was corrected: edges sewn together are alike. */
export function drawGore(pen: Pen, use: SkirtUse, { id, name, index, gores }: Gore): PiecePen {
  const gore = skirtPiece(pen, use, id, name)
  const mask = use.sewnTo?.uses ?? 0n
  const trumpet = pen.chosen('flareFrom') === 'above the hem'
  goreMarks(pen, gore, trumpet)
  const half = use.sewnTo
    ? (use.sewnTo.front.length + use.sewnTo.back.length) / gores
    : pen.value('goreWaist') / 2
  const lean = Math.atan((1.4 * Math.max(0, gore.at('hipRight').x - half)) / gore.at('hipRight').y)
  edgeEnds(pen, gore, trumpet, half, lean, use)
  const edge = (side: 'left' | 'right'): TakenIn =>
    takeIn(pen, gore, sideOf(gore, trumpet, lean), {
      seams: seamsOfEdge(gores, index, side).map((seam) => `${use.prefix}${seam}`),
      ends: use.sewnTo ? 'stay' : 'move',
      origin: use.origin,
      instead: sewnToBodice,
      ...(side === 'left' ? { turned: mirrorX, suffix: '-left' } : {}),
    })
  const [right, left] = [edge('right'), edge('left')]
  const [top, topLeft] = [right.top ?? 'waistRight', left.top ?? 'waistLeft']
  const [low, lowLeft] = [right.end ?? 'hemRight', left.end ?? 'hemLeft']
  const moved = right.top ?? left.top ?? (gore.byRule('waistRight') === 'waistRight' ? undefined : top)
  const waist = moved ? waistBetween(left.path, right.path) : waistArc(gore.at(top), half, lean)
  gore.curve('waist', pinned(waist, gore.at(topLeft), gore.at(top)), topLeft, top, {
    role: 'waist',
    allowance: 'waistAllowance',
    finish: waistFinish(pen, use),
    say: 'Draw the waist, square to both edges',
    uses: waistUses,
    mask,
  })
  const seam = { role: 'seam', allowance: 'sideAllowance', uses: [...waistUses, ...hemUses], mask } as const
  gore.curve('right', pinned(right.path, gore.at(top), gore.at(low)), top, low, {
    ...seam,
    say: 'Draw the edge over the hip to the hem',
  })
  const hem = hemOf(pen, left.path, right.path, gore.at('hemMiddle'))
  gore.curve('hem', pinned(hem, gore.at(low), gore.at(lowLeft)), low, lowLeft, {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Draw the hem, square to both edges',
    uses: hemUses,
  })
  gore.curve('left', pinned(reversePath(left.path), gore.at(lowLeft), gore.at(topLeft)), lowLeft, topLeft, {
    ...seam,
    corner: 'turned',
    say: 'Draw the other edge alike',
  })
  hipLine(gore)
  gore.grain({ x: 0, y: gore.at('hipLevel').y * 0.5 }, { x: 0, y: gore.at('hemMiddle').y - 60 })
  return gore
}

/** Middle, levels and the width at them. */
function goreMarks(pen: Pen, gore: PiecePen, trumpet: boolean): void {
  const onCentre = true
  gore.start(
    'waistMiddle',
    { x: 0, y: 0 },
    'Mark the middle of the waist on a line that lies with the grain',
    {
      fixed: 'It is where the drawing begins: move the end of the waist on the right edge.',
    },
  )
  gore.go('hipLevel', 'waistMiddle', 'down', 'hipLine', {
    say: 'Come down to the level of the hip',
    onCentre,
    shared: true,
  })
  gore.go('hemMiddle', 'waistMiddle', 'down', 'length', {
    say: 'Come down the length',
    drag: ['length'],
    fixed: hemFollows,
  })
  acrossAt(gore, 'hip', 'hipLevel')
  if (trumpet) {
    gore.go('flareLevel', gore.byRule('hemMiddle'), 'up', 'trumpetDrawn', {
      say: 'From the hem go up to where the flare begins',
      drag: ['trumpetHeight'],
      onCentre,
      shared: true,
    })
    acrossAt(gore, 'flare', 'flareLevel')
  }
  const { id } = gore
  pen.tag({ piece: id, from: 'waistMiddle', to: 'hemMiddle', label: 'Length', value: 'length' })
  pen.tag({ piece: id, from: 'hipLeft', to: 'hipRight', label: 'Hip of the gore' })
}

/** Half the hip to both sides of a level; a correction of the right moves the left with it. */
function acrossAt(gore: PiecePen, id: 'hip' | 'flare', level: string): void {
  const [right, left] = [`${id}Right`, `${id}Left`]
  gore.go(right, level, 'right', 'goreHalfHip', {
    say: 'Go across half the hip of the gore',
    round: 'up',
    shared: true,
  })
  if (gore.byRule(right) === right) {
    gore.go(left, level, 'left', 'goreHalfHip', {
      say: 'Go as far to the other side',
      round: 'up',
      fixed: alike,
    })
    return
  }
  gore.place(left, mirrored(gore.at(right)), {
    say: 'The same on the other side',
    through: [right],
    fixed: alike,
  })
}

/** Where the edges end at waist and hem. */
function edgeEnds(
  pen: Pen,
  gore: PiecePen,
  trumpet: boolean,
  half: number,
  lean: number,
  use: SkirtUse,
): void {
  const mask = use.sewnTo?.uses ?? 0n
  // sin(lean)/lean and so on, which stay finite for an edge that stands straight.
  const [across, up] = lean < 1e-6 ? [1, 0] : [Math.sin(lean) / lean, (1 - Math.cos(lean)) / lean]
  const edge = { uses: waistUses, mask }
  gore.place(
    'waistRight',
    { x: half * across, y: -half * up },
    {
      ...edge,
      say: 'Mark the end of the waist, its curve square to the edge',
      shared: true,
      ...(use.sewnTo ? { fixed: sewnToBodice } : {}),
    },
  )
  gore.place('waistLeft', mirrored(gore.at('waistRight')), {
    ...edge,
    say: 'Mark its other end',
    fixed: alike,
  })
  const from = gore.at(trumpet ? 'flareRight' : 'hipRight')
  const long = gore.at(gore.byRule('hemMiddle')).y - from.y
  const flare = Math.min(pen.value('flareDrawn'), long * 0.75)
  const low = { x: from.x + flare, y: from.y + Math.sqrt(long * long - flare * flare) }
  gore.place('hemRight', low, {
    say: 'Mark the hem, flared from the straight',
    uses: hemUses,
    drag: ['hemFlare'],
    fixed: hemFollows,
  })
  gore.place('hemLeft', mirrored(gore.at('hemRight')), {
    say: 'Mark it on the other edge',
    uses: hemUses,
    fixed: hemFollows,
  })
}

/** The right edge from waist to hem. */
function sideOf(gore: PiecePen, trumpet: boolean, lean: number): Path {
  const [top, hip, low] = [gore.at('waistRight'), gore.at('hipRight'), gore.at('hemRight')]
  const from = trumpet ? gore.at('flareRight') : hip
  const along = { x: Math.sin(lean), y: Math.cos(lean) }
  const onward = unit(trumpet ? subtract(from, hip) : subtract(low, from))
  const curved = (hip.y - top.y) * 0.36
  const over = cubic(top, add(top, scale(along, curved)), add(hip, scale(onward, -curved)), hip)
  if (!trumpet) return openPath([over, { kind: 'line', from: hip, to: low }])
  // The last stretch is straight, so that the hem's allowance turns up onto it flat.
  const long = gore.at(gore.byRule('hemMiddle')).y - from.y
  const steep = unit({ x: 1.4 * (low.x - from.x), y: long })
  const bend = add(low, scale(steep, -long * 0.45))
  const pull = (bend.y - from.y) * 0.4
  const bell = cubic(from, add(from, scale(onward, pull)), add(bend, scale(steep, -pull)), bend)
  const last = { kind: 'line', from: bend, to: low } as const
  return openPath([over, { kind: 'line', from: hip, to: from }, bell, last])
}

/** The waist as an arc of exactly its length that meets both edges square. */
function waistArc(top: Point, half: number, lean: number): Path {
  const reach = lean < 1e-6 ? 1 / 3 : ((2 / 3) * Math.tan(lean / 2)) / (lean / 2) / 2
  const handle = 2 * half * reach
  const [dx, dy] = [Math.cos(lean) * handle, Math.sin(lean) * handle]
  const start = mirrored(top)
  return openPath([cubic(start, add(start, { x: dx, y: dy }), add(top, { x: -dx, y: dy }), top)])
}

/** The waist between two edges that corrections moved, square to both. */
function waistBetween(left: Path, right: Path): Path {
  const [from, to] = [startOf(left), startOf(right)]
  const [down, on] = [startTangent(left), startTangent(right)]
  const leaves = { x: down.y, y: -down.x }
  const arrives = { x: on.y, y: -on.x }
  return fairCurve(from, leaves, to, arrives) ?? straight(from, to)
}

/** From the right edge through the middle to the left, square to all three. */
function hemOf(pen: Pen, left: Path, right: Path, middle: Point): Path {
  const half = (edge: Path): Path => {
    const [low, down] = [endOf(edge), endTangent(edge)]
    const fair = fairCurve(low, { x: -down.y, y: down.x }, middle, { x: -1, y: 0 })
    if (fair || Math.abs(down.x) < 1e-9) return fair ?? straight(low, middle)
    return pen.refuse({
      field: 'hemFlare',
      code: 'impossible-shape',
      message: 'The hem of a gore does not run in one fair curve to its middle. Flare more.',
    })
  }
  return joinPaths(half(right), reversePath(transformPath(mirrorX, half(transformPath(mirrorX, left)))))
}

/** The level of the hip, from edge to edge as they are drawn. */
function hipLine(gore: PiecePen): void {
  const { y } = gore.at('hipLevel')
  const level = straight({ x: -4000, y }, { x: 4000, y })
  const at = (edge: string, mark: string): Point =>
    intersections(gore.edge(edge).path, level)[0]?.point ?? gore.at(mark)
  gore.inner(
    'hip-level',
    'level',
    straight(at('left', 'hipLeft'), at('right', 'hipRight')),
    'Mark the level of the hip',
    gore.usesOf('hipLeft', 'hipRight'),
  )
}
