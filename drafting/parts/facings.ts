import type { Run } from '../contract'
import { distance } from '../geometry'
import type { Pen } from '../pen/pen'
import { armholeFacing, shoulderFacing, type Faced } from './facing'
import { neckFacing } from './neck-facing'
import type { Centre } from './openings/opening'
import { sewNeck } from './sew-neck'

/** A body to be faced, and how its centre ends. */
export type FacedHalf = readonly [Faced, Centre]

/** Shorter shoulders, mm, carry one facing for neck and armhole together. Common practice. */
const narrowShoulder = 70

/**
 * Faces the neck, and the armholes where there is no sleeve, of a front and a back.
 *
 * @param bare whether the armholes have no sleeve.
 * @param shoulderEase the rule by which the back shoulder is longer, where the facing covers the whole of it.
 * @param runs the edges that a neckline or armhole consists of, where a dart divides it; one edge of that name otherwise.
 */
export function faceNeckAndArmholes(
  pen: Pen,
  front: FacedHalf,
  back: FacedHalf,
  bare: boolean,
  {
    runs = (piece, edge) => [{ piece, edge }],
    shoulderEase,
  }: { runs?: (piece: string, edge: string) => Run[]; shoulderEase?: string } = {},
): void {
  const body = front[0].piece
  const shoulder = distance(body.at('sideNeck'), body.at('shoulderTip'))
  // A lapped front is faced to its foot, which no facing of neck and armhole together reaches.
  const together = bare && shoulder < narrowShoulder && front[1].kind !== 'lap'
  const asked = pen.length('facingDepth')
  const depth = Math.min(asked, shoulder - 12)
  if (!together && depth < asked) {
    pen.caution(
      'facing-narrowed',
      `The shoulder is only ${pen.say(shoulder)} long, so the facing is cut ${pen.say(depth)} deep.`,
      'facingDepth',
      'neckWidening',
    )
  }
  const sewOn = (edge: string, faced: Faced, facing: string): void =>
    pen.sew({
      id: `${faced.piece.id}-${edge}-facing`,
      name: `${faced.piece.name} ${edge} to its facing`,
      a: runs(faced.piece.id, edge),
      b: [{ piece: facing, edge }],
      join: 'faced',
    })
  const [ofFront, ofBack] = [front, back].map(([faced, centre]) => {
    const neck = together ? shoulderFacing(pen, faced, asked, centre) : neckFacing(pen, faced, depth, centre)
    if (together) sewOn('armhole', faced, neck.id)
    return neck.id
  }) as [string, string]
  const necklines = { front: runs(front[0].piece.id, 'neckline'), back: runs(back[0].piece.id, 'neckline') }
  sewNeck(pen, front, back, necklines, { front: ofFront, back: ofBack })
  joinFacings(
    pen,
    'neck-facing',
    together ? ['shoulder', 'side'] : ['shoulder'],
    together ? shoulderEase : undefined,
  )
  if (!bare || together) return
  for (const [faced] of [front, back]) sewOn('armhole', faced, armholeFacing(pen, faced, depth).id)
  joinFacings(pen, 'armhole-facing', ['shoulder', 'side'])
}

function joinFacings(pen: Pen, facing: string, edges: readonly string[], shoulderEase?: string): void {
  const names: Record<string, string> = { 'neck-facing': 'Neck facing', 'armhole-facing': 'Armhole facing' }
  for (const edge of edges) {
    pen.sew({
      id: `${facing}-${edge}`,
      name: `${names[facing]}, ${edge}`,
      a: [{ piece: `back-${facing}`, edge }],
      b: [{ piece: `front-${facing}`, edge }],
      ...(edge === 'shoulder' && shoulderEase ? { join: 'eased' as const, easeFrom: shoulderEase } : {}),
      smooth: true,
    })
  }
}
