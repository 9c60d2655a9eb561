import type { Pen } from '../../pen/pen'

/** Where a bust dart may open. The upper edges come first, clockwise from the centre neck. */
export type DartPlace = 'neck' | 'shoulder' | 'armhole' | 'side' | 'waist' | 'centre front'

/** A dart that takes up the fullness of the bust, or its share of it. */
export interface BustDart {
  readonly id: string
  readonly place: DartPlace
  /** Its angle about the bust point, degrees. */
  readonly degrees: number
}

/** How a bodice is shaped over the bust: by darts, or by seams from the shoulder or the armhole to the waist. */
export type Shaping = 'darts' | 'princess from the shoulder' | 'princess from the armhole'

/** The shaping of a style; a garment that does not offer it has darts. */
export function shapingOf(pen: Pen): Shaping {
  return (pen.offered('shaping') as Shaping | undefined) ?? 'darts'
}

/** The edge on which princess seams begin, or undefined for a bodice with darts. */
export function princessPlace(pen: Pen): 'shoulder' | 'armhole' | undefined {
  const shaping = shapingOf(pen)
  if (shaping === 'darts') return undefined
  return shaping === 'princess from the shoulder' ? 'shoulder' : 'armhole'
}

/**
 * The bust darts of a style: one, two that share its angle, or the one that a princess seam swallows.
 *
 * @param buttoned whether the front laps over: then no dart can open at its centre.
 */
export function bustDarts(pen: Pen, buttoned: boolean): readonly BustDart[] {
  const degrees = pen.value('bustDartAngle')
  const princess = princessPlace(pen)
  if (princess) return [{ id: 'princess', place: princess, degrees }]
  const placeOf = (id: string): DartPlace | 'nothing' => {
    const place = (pen.offered(id) ?? 'nothing') as DartPlace | 'nothing'
    if (place !== 'centre front' || !buttoned) return place
    pen.caution(
      'dart-moved',
      'A front that buttons has no room for a dart at its centre, so it opens in the side seam. Choose another place, or a zip at the back.',
      id,
      'backOpening',
    )
    return 'side'
  }
  const place = placeOf('dartTo') as DartPlace
  const other = placeOf('dartSharedWith')
  if (other === 'nothing') return [{ id: 'bust-dart', place, degrees }]
  if (other === place) {
    pen.caution(
      'dart-not-shared',
      `The bust dart is shared with the place where it already is (${place}), so there is one dart.`,
      'dartSharedWith',
      'dartTo',
    )
    return [{ id: 'bust-dart', place, degrees }]
  }
  const second = degrees * pen.value('dartShare')
  return [
    { id: 'bust-dart', place, degrees: degrees - second },
    { id: 'bust-dart-2', place: other, degrees: second },
  ]
}
