import type { Path } from '../../contract'
import {
  distance,
  endOf,
  intersections,
  pathLength,
  pointAt,
  startOf,
  tangentOn,
  unit,
  cross,
} from '../../geometry'
import type { Pen } from '../../pen/pen'
import { between, straight } from '../../pen/piece-pen'
import { chosenNeckline } from '../necklines'
import type { BustDart, DartPlace } from './bust-darts'
import {
  findOpenings,
  framesOf,
  type FrontBlock,
  type Mouth,
  type Opening,
  type UpperEdge,
} from './open-darts'

const share =
  (part: number) =>
  (path: Path): number =>
    pathLength(path) * part

/** How far a dart at the centre front stays clear of the neck and the waist, mm. */
const clear = 35

/**
 * Where a bust dart opens: the edge, and how far along it. At the waist it opens in the waist dart instead. Shares of the
 * edges are common practice, no published source.
 *
 * @param bustLevel y of the bust point, mm.
 */
export function mouthOf(pen: Pen, dart: BustDart, bustLevel: number): Mouth | undefined {
  const princess = dart.id === 'princess'
  const places: Readonly<Record<DartPlace, Omit<Mouth, 'dart'> | undefined>> = {
    neck: { edge: 'neckline', along: share(chosenNeckline(pen).dartAt ?? 0.5) },
    shoulder: { edge: 'shoulder', along: share(0.5) },
    armhole: { edge: 'armhole', along: share(princess ? 0.5 : 0.6) },
    side: { edge: 'side', along: () => pen.length('dartBelowArmhole') },
    waist: undefined,
    'centre front': {
      edge: 'centre',
      along: (path) => {
        const [neck, waist] = [startOf(path).y, endOf(path).y]
        return Math.min(Math.max(bustLevel - neck, clear), waist - neck - clear)
      },
    },
  }
  const place = places[dart.place]
  return place && { ...place, dart }
}

/** A dart shorter than this is a stump; flatter to its edge, or nearer to a corner, it cannot be capped. mm, degrees, mm */
const shortest = 55
const flattest = 35
const nearest = 22

/** Whether a dart cannot be sewn where it opens. */
function unsound(one: Opening, edges: readonly UpperEdge[]): boolean {
  const edge = edges.find(({ id }) => id === one.edge)?.path
  if (!edge) return false
  const { point } = one
  const along = one.along(edge)
  const mouth = pointAt(edge, along)
  const leg = between(mouth, point)
  const long = distance(mouth, point)
  const steep = (Math.asin(Math.min(1, Math.abs(cross(unit(leg), tangentOn(edge, along))))) * 180) / Math.PI
  const clearOfEnds = Math.min(along, pathLength(edge) - along)
  if (long < shortest || steep < flattest || clearOfEnds < nearest) return true
  const whole = straight(mouth, point)
  return edges.some(({ path }) => intersections(path, whole).some(({ b }) => b > 1))
}

/** A princess seam from the shoulder keeps clear of a wide or deep neckline: it starts nearer to the shoulder tip there. */
function clearOfNeck(pen: Pen, block: FrontBlock): readonly Opening[] {
  const openings = findOpenings(block)
  const [seam] = openings
  if (seam?.dart.id !== 'princess' || seam.edge !== 'shoulder') return openings
  const crosses = ([one]: readonly Opening[]): boolean => {
    const edges = block.outline(framesOf(block, one ? [one] : []).swing)
    const [neckline, shoulder] = edges
    if (!one || !neckline || !shoulder) return false
    const whole = straight(pointAt(shoulder.path, one.along(shoulder.path)), one.point)
    return intersections(neckline.path, whole).length > 0
  }
  if (!crosses(openings)) return openings
  const outer = findOpenings({ ...block, mouths: [{ ...seam, along: share(0.82) }] })
  if (!crosses(outer)) return outer
  pen.refuse({
    field: 'neckWidening',
    code: 'impossible-shape',
    message:
      'A princess seam from the shoulder would cut into this neckline. Make the neck less wide or deep, or start the seam at the armhole.',
    min: 0,
    max: Math.max(0, Math.floor(pen.value('neckWidening') - 10)),
  })
}

/**
 * Where the bust darts of a front open. A dart that would cross the neckline, end in a stump or run out beside its edge is
 * opened in the side seam instead, and that is said.
 */
export function soundOpenings(pen: Pen, block: FrontBlock): readonly Opening[] {
  const openings = clearOfNeck(pen, block)
  const frames = framesOf(block, openings)
  const edges = block.outline(frames.swing)
  const bad = frames.upper.filter(
    (one) => one.dart.id !== 'princess' && one.edge !== 'side' && unsound(one, edges),
  )
  if (bad.length === 0) return openings
  for (const { dart } of bad) {
    pen.caution(
      'dart-moved',
      `A bust dart to the ${dart.place} would have no room beside this neckline, so it opens in the side seam. Make the neck less wide or deep, or choose another place.`,
      'dartTo',
      'neckWidening',
      'frontNeckDrop',
    )
  }
  const kept = block.mouths.filter((mouth) => !bad.some(({ dart }) => dart === mouth.dart))
  const moved = bad.reduce((sum, { dart }) => sum + dart.degrees, 0)
  const there = kept.find(({ edge }) => edge === 'side')
  const first = bad[0] as Opening
  const side: BustDart = {
    id: there?.dart.id ?? first.dart.id,
    place: 'side',
    degrees: moved + (there?.dart.degrees ?? 0),
  }
  const mouth = mouthOf(pen, side, block.bust.y)
  return findOpenings({
    ...block,
    mouths: [...kept.filter((one) => one !== there), ...(mouth ? [mouth] : [])],
  })
}
