import { intersections } from '../geometry'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import type { Centre } from './openings/opening'
import { dropPath } from './openings/drop'

/** Marks traced from the body, so that corrections there follow here. */
export function copyMarks(facing: PiecePen, body: PiecePen, ids: readonly string[], uses: bigint): void {
  for (const id of ids) facing.trace(id, body, uses)
}

/** Facings are cut once in the cloth and once in interfacing. */
export function cutFacing(facing: PiecePen, onFold: boolean): void {
  const count = onFold ? 1 : 2
  facing.cut(
    { cloth: 'main', count, onFold, handed: !onFold },
    { cloth: 'interfacing', count, onFold, handed: !onFold },
  )
}

/**
 * The centre of a facing, from its mark `centreEdge` to the neckline: the fold, turned in beside a zip, or a seam where the body has
 * one; with the grain, and with the keyhole that the body has.
 */
export function closeFacing(pen: Pen, facing: PiecePen, centre: Centre): void {
  const onFold = centre.kind === 'fold'
  const says = {
    fold: 'The centre lies on the fold',
    seam: 'The centre is sewn like the garment’s',
    zip: 'The centre is turned in beside the zip',
    lap: 'The centre',
  }
  facing.line('centre', 'centreEdge', 'centreNeck', {
    role: onFold ? 'fold' : centre.kind === 'seam' ? 'seam' : 'opening',
    ...(onFold ? {} : { allowance: 'centreBackAllowance' }),
    say: says[centre.kind],
  })
  if (centre.kind === 'seam') {
    pen.sew({
      id: `${facing.id}-centre`,
      name: `${facing.name}, centre`,
      a: [{ piece: facing.id, edge: 'centre' }],
      b: [{ piece: facing.id, edge: 'centre', mirrored: true }],
    })
  }
  cutFacing(facing, onFold)
  layGrain(facing, Math.min(14, Math.abs(facing.at('sideNeck').x) / 3))
  const [top, bottom] = [facing.at('centreNeck'), facing.at('centreEdge')]
  if (centre.keyhole) {
    facing.inner(
      'keyhole',
      'placement',
      dropPath(top, centre.keyhole.depth, centre.keyhole.half),
      'Trace the keyhole: stitch round it, right sides together, before the neckline is turned',
      facing.usesOf('centreNeck', 'centreEdge'),
      'copy',
    )
  }
  // A zip needs the facing a little clear of its teeth; the turn is marked, the neckline stays whole.
  if (centre.kind === 'zip' && bottom.y - top.y > 10) {
    facing.inner(
      'zip-turn',
      'turn',
      straight({ x: 4, y: top.y }, { x: 4, y: bottom.y }),
      'Turn in 4 mm short of the centre, clear of the zip',
      facing.usesOf('centreNeck', 'centreEdge'),
    )
  }
}

/** Lays the grain along the centre, so far out, between the neckline and the lower edge: inside whatever their shapes. */
export function layGrain(facing: PiecePen, out: number, lower = 'outer'): void {
  const column = straight({ x: out, y: -2000 }, { x: out, y: 4000 })
  const above = intersections(facing.edge('neckline').path, column).map(({ point }) => point.y)
  const top = Math.max(...above, facing.at('sideNeck').y)
  const below = intersections(facing.edge(lower).path, column).map(({ point }) => point.y)
  const bottom = Math.min(...below.filter((y) => y > top), top + 1000)
  const clear = Math.min(5, (bottom - top) / 4)
  facing.grain({ x: out, y: top + clear }, { x: out, y: bottom - clear })
}
