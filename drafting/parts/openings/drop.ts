import type { Path, Point } from '../../contract'
import { cubic, openPath } from '../../geometry'
import { nothing, type Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'

/**
 * One half of a drop-shaped keyhole, from the neckline down its edge to its lowest point on the centre: closed at the neck, widest
 * low, round at the bottom.
 *
 * @param depth, half mm from the neckline to the bottom, and from the centre to its widest point.
 */
export function dropPath(top: Point, depth: number, half: number): Path {
  const widest = { x: top.x + half, y: top.y + depth - Math.min(half, depth * 0.35) }
  const bottom = { x: top.x, y: top.y + depth }
  const low = bottom.y - widest.y
  return openPath([
    cubic(
      top,
      { x: top.x + half * 0.15, y: top.y + (widest.y - top.y) * 0.4 },
      { x: widest.x, y: widest.y - (widest.y - top.y) * 0.4 },
      widest,
    ),
    cubic(
      widest,
      { x: widest.x, y: widest.y + low * 0.552 },
      { x: bottom.x + half * 0.552, y: bottom.y },
      bottom,
    ),
  ])
}

/** Half as wide as it looks right and can be turned. Common practice, no published source. mm */
const halfOf = (depth: number): number => Math.min(Math.max(depth * 0.18, 14), 32)

/**
 * Draws a keyhole on the fold of a half: the cloth stays whole until the facing is stitched on round the drop; then it is cut out
 * inside and turned. A loop and a button close it at the neck.
 *
 * @param value style value that gives its depth.
 * @param depth mm, where it had to be deeper than the style says.
 * @param needed what that depth follows from then.
 * @returns its size for the facing, which carries the same line.
 */
export function drawDrop(
  pen: Pen,
  piece: PiecePen,
  value: string,
  depth = pen.length(value),
  needed: Mask = nothing,
): { readonly depth: number; readonly half: number } {
  const half = halfOf(depth)
  const asAsked = depth === pen.length(value)
  const top = piece.at('centreNeck')
  const end = { x: top.x, y: top.y + depth }
  const say = 'Down the fold mark the bottom of the keyhole'
  if (asAsked) piece.go('keyholeEnd', 'centreNeck', 'down', value, { say, drag: [value] })
  else
    piece.place('keyholeEnd', end, {
      say,
      mask: needed,
      uses: [value],
      through: ['centreNeck'],
      stepKind: 'solve',
    })
  pen.tag({
    piece: piece.id,
    from: 'centreNeck',
    to: 'keyholeEnd',
    label: 'Keyhole',
    ...(asAsked ? { value } : {}),
  })
  piece.inner(
    'keyhole',
    'placement',
    dropPath(top, depth, half),
    'Stitch the facing on round the drop, cut it out 5 mm inside, snip and turn',
    piece.usesOf('keyholeEnd'),
    'curve',
  )
  pen.notion({ kind: 'button', count: 1 })
  return { depth, half }
}
