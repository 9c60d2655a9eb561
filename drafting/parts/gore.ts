import type { Path, Point } from '../contract'
import {
  add,
  cubic,
  endTangent,
  joinPaths,
  mirrorX,
  openPath,
  reversePath,
  scale,
  subtract,
  transformPath,
  unit,
} from '../geometry'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import { fairCurve } from './hem'

const waistUses = ['goreWaist', 'goreHalfHip', 'hipLine']
const hemUses = ['goreHalfHip', 'hipLine', 'length', 'flareDrawn', 'flareFrom']
const mirrored = ({ x, y }: Point): Point => ({ x: -x, y })

/** A gore, the mirror image of itself about its middle: all edges that are sewn together are alike. */
export function drawGore(pen: Pen, id: string, name: string): PiecePen {
  const gore = pen.piece(id, name)
  const trumpet = pen.chosen('flareFrom') === 'above the hem'
  gore.start('waistMiddle', { x: 0, y: 0 }, 'Mark the middle of the waist on a line that lies with the grain')
  gore.go('hipLevel', 'waistMiddle', 'down', 'hipLine', { say: 'Come down to the level of the hip' })
  gore.go('hemMiddle', 'waistMiddle', 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  acrossAt(gore, 'hip', 'hipLevel')
  if (trumpet) {
    gore.go('flareLevel', 'hemMiddle', 'up', 'trumpetDrawn', {
      say: 'From the hem go up to where the flare begins',
      drag: ['trumpetHeight'],
    })
    acrossAt(gore, 'flare', 'flareLevel')
  }
  pen.tag({ piece: id, from: 'waistMiddle', to: 'hemMiddle', label: 'Length', value: 'length' })
  pen.tag({ piece: id, from: 'hipLeft', to: 'hipRight', label: 'Hip of the gore' })
  const { side, waist } = edgesOf(pen, gore, trumpet)
  const [top, low] = [side.segments[0]?.from as Point, side.segments.at(-1)?.to as Point]
  const edge = { say: 'Mark the end of the waist, its curve square to the edge', uses: waistUses }
  gore.place('waistRight', top, edge)
  gore.place('waistLeft', mirrored(top), { ...edge, say: 'Mark its other end' })
  const flare = { say: 'Mark the hem, flared from the straight', uses: hemUses }
  gore.place('hemRight', low, { ...flare, drag: ['hemFlare'] })
  gore.place('hemLeft', mirrored(low), { ...flare, say: 'Mark it on the other edge' })
  gore.curve('waist', waist, 'waistLeft', 'waistRight', {
    role: 'waist',
    allowance: 'waistAllowance',
    finish: pen.chosen('waistband') ? 'seam' : 'bound',
    say: 'Draw the waist, square to both edges',
    uses: waistUses,
  })
  const seam = { role: 'seam', allowance: 'sideAllowance', uses: [...waistUses, ...hemUses] } as const
  gore.curve('right', side, 'waistRight', 'hemRight', {
    ...seam,
    say: 'Draw the edge over the hip to the hem',
  })
  gore.curve('hem', hemOf(side, gore.at('hemMiddle')), 'hemRight', 'hemLeft', {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Draw the hem, square to both edges',
    uses: hemUses,
  })
  gore.curve('left', reversePath(transformPath(mirrorX, side)), 'hemLeft', 'waistLeft', {
    ...seam,
    corner: 'turned',
    say: 'Draw the other edge alike',
  })
  gore.inner(
    'hip-level',
    'level',
    straight(gore.at('hipLeft'), gore.at('hipRight')),
    'Mark the level of the hip',
    gore.usesOf('hipLeft', 'hipRight'),
  )
  gore.grain({ x: 0, y: gore.at('hipLevel').y * 0.5 }, { x: 0, y: gore.at('hemMiddle').y - 60 })
  return gore
}

/** Half the hip to both sides of a level. */
function acrossAt(gore: PiecePen, id: 'hip' | 'flare', level: string): void {
  gore.go(`${id}Right`, level, 'right', 'goreHalfHip', {
    say: 'Go across half the hip of the gore',
    round: 'up',
  })
  gore.go(`${id}Left`, level, 'left', 'goreHalfHip', { say: 'Go as far to the other side', round: 'up' })
}

/** The right edge from waist to hem, and the waist as an arc of exactly its length that meets both edges square. */
function edgesOf(pen: Pen, gore: PiecePen, trumpet: boolean): { side: Path; waist: Path } {
  const hip = gore.at('hipRight')
  const half = pen.value('goreWaist') / 2
  const lean = Math.atan((1.4 * Math.max(0, hip.x - half)) / hip.y)
  // sin(lean)/lean and so on, which stay finite for an edge that stands straight.
  const [across, up, reach] =
    lean < 1e-6
      ? [1, 0, 1 / 3]
      : [Math.sin(lean) / lean, (1 - Math.cos(lean)) / lean, ((2 / 3) * Math.tan(lean / 2)) / (lean / 2) / 2]
  const top = { x: half * across, y: -half * up }
  const along = { x: Math.sin(lean), y: Math.cos(lean) }
  const handle = 2 * half * reach
  const start = mirrored(top)
  const waist = openPath([
    cubic(
      start,
      add(start, { x: along.y * handle, y: along.x * handle }),
      add(top, { x: -along.y * handle, y: along.x * handle }),
      top,
    ),
  ])
  const from = trumpet ? gore.at('flareRight') : hip
  const long = gore.at('hemMiddle').y - from.y
  const flare = Math.min(pen.value('flareDrawn'), long * 0.75)
  const low = { x: from.x + flare, y: from.y + Math.sqrt(long * long - flare * flare) }
  const onward = trumpet ? { x: 0, y: 1 } : unit(subtract(low, from))
  const curved = (hip.y - top.y) * 0.36
  const over = cubic(top, add(top, scale(along, curved)), add(hip, scale(onward, -curved)), hip)
  if (!trumpet) return { side: openPath([over, { kind: 'line', from: hip, to: low }]), waist }
  // The last stretch is straight, so that the hem's allowance turns up onto it flat.
  const steep = unit({ x: 1.4 * flare, y: long })
  const bend = add(low, scale(steep, -long * 0.45))
  const pull = (bend.y - from.y) * 0.4
  const bell = cubic(from, { x: from.x, y: from.y + pull }, add(bend, scale(steep, -pull)), bend)
  const last = { kind: 'line', from: bend, to: low } as const
  return { side: openPath([over, { kind: 'line', from: hip, to: from }, bell, last]), waist }
}

/** From the right edge through the middle to the left, square to all three. */
function hemOf(side: Path, middle: Point): Path {
  const low = side.segments.at(-1)?.to as Point
  const down = endTangent(side)
  const right = fairCurve(low, { x: -down.y, y: down.x }, middle, { x: -1, y: 0 }) ?? straight(low, middle)
  return joinPaths(right, reversePath(transformPath(mirrorX, right)))
}
