import type { Path } from '../contract'

/** The cut line of a piece whose edges have no allowance: the stitch line itself. */
export function cutLine(
  edges: readonly { readonly id: string; readonly path: Path }[],
  _darts: unknown,
): { cuts: readonly Path[]; cutLine: Path; clipped: readonly string[] } {
  return {
    cuts: edges.map((edge) => edge.path),
    cutLine: { segments: edges.flatMap((edge) => edge.path.segments), closed: true },
    clipped: [],
  }
}
