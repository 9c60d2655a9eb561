import { startOf } from '../geometry'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'
import type { Centre } from './openings/opening'
import { innerGrain } from './inner-grain'
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
  const side = facing.at('sideNeck').x
  const outer = startOf(facing.edge('outer').path).x
  layGrain(facing, Math.min(14, side / 3), side * 0.6, side * 0.85, (side + outer) / 2)
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

/** The grain lies in the first of these columns, mm from the centre, or in a later one where the facing is much longer. */
export function layGrain(facing: PiecePen, ...columns: readonly number[]): void {
  const outline = facing.edges.map((edge) => edge.path)
  const grain = innerGrain(outline, columns)
  if (grain) facing.grain(grain.from, grain.to)
}
