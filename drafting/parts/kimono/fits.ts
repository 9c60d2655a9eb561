import type { Path, Point } from '../../contract'
import { add, cross, dot, intersections, pathLength, scale, subtract, unit } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { between, straight, type PiecePen } from '../../pen/piece-pen'
import { hasGusset } from './room'

/** How a kimono body fits: round bust and hip, round the arm, its neck and its hems. */
export function fitKimono(pen: Pen, front: PiecePen, back: PiecePen): void {
  const halves = [front, back]
  const bustAt = hasGusset(pen) ? 'underarm' : 'roundEnd'
  const bust = halves.map((piece) => {
    const end = piece.at(bustAt)
    return { piece: piece.id, path: straight({ x: 0, y: end.y }, end), times: 2, length: end.x }
  })
  const low = front.at(bustAt).y
  if (halves.every((piece) => piece.at('centreNeck').y < low)) {
    pen.fit(fitAcross('bust', 'at-least', pen.value('bustEase'), pen.value('bust'), bust))
  }
  const hips = halves.map((piece) => ({ piece, path: across(piece, pen.value('hipLevel')) }))
  if (hips.every(({ path }) => path)) {
    const girths = hips.map(({ piece, path }) => ({
      piece: piece.id,
      path: path as Path,
      times: 2,
      length: pathLength(path as Path),
    }))
    pen.fit(fitAcross('hip', 'at-least', 0, pen.value('hip'), girths))
    for (const { piece, path } of hips) {
      const uses = pen.usesOf(['hipLevel']) | piece.edge('side').uses
      piece.inner('hip-level', 'level', path as Path, 'Mark the level of the hip', uses)
    }
  }
  const arm = halves.map((piece) => roundArm(pen, piece))
  pen.fit(fitAcross('biceps', 'at-least', pen.value('kimonoEase'), pen.value('upperArm'), arm))
  const edge = (id: string, times: number) =>
    halves.map((piece) => ({
      piece: piece.id,
      path: piece.edge(id).path,
      times,
      length: piece.lengthOf(id),
    }))
  const neck = edge('neckline', 2)
  const long = neck.reduce((sum, one) => sum + one.times * one.length, 0)
  const close = long < pen.value('neckBase')
  pen.fit(fitAcross('neck', close ? 'shown' : 'at-least', 0, pen.value('neckBase'), neck))
  pen.fit(fitAcross('sleeve-hem', 'shown', 0, undefined, edge('mouth', 1)))
  pen.fit(fitAcross('hem', 'shown', 0, undefined, edge('hem', 2)))
}

/** From the centre to the side at a level, where the side is sewn there. */
function across(piece: PiecePen, y: number): Path | undefined {
  const met = intersections(piece.edge('side').path, straight({ x: 0, y }, { x: 4000, y })).at(-1)
  return met && straight({ x: 0, y }, met.point)
}

/** Square across the sleeve from where its underside begins to be straight. */
function roundArm(pen: Pen, piece: PiecePen) {
  const at = (id: string): Point => piece.at(id)
  const out = unit(between(at('underarm'), at('wristLow')))
  const low = hasGusset(pen) ? add(at('underarm'), scale(out, pen.length('gussetSide'))) : at('roundStart')
  const along = unit(between(at('sideNeck'), at('wristTop')))
  const foot = add(at('sideNeck'), scale(along, dot(subtract(low, at('sideNeck')), along)))
  const path = straight(foot, low)
  return { piece: piece.id, path, times: 1, length: Math.abs(cross(along, subtract(low, foot))) }
}
