import type { Pen } from '../../pen/pen'

/** Buttons nearer than this would lie on each other; common practice, mm. */
const nearest = 35
/** The last button stays so far above the lower edge, where the wearer walks. Common practice, mm. */
const aboveFoot = 60

/**
 * Levels of the buttons down a front: as many even spaces as the style says from the first to the bust, where a gap would show, and
 * on in the same spaces.
 *
 * @param first level of the first button, mm.
 * @param bust level of the bust, mm.
 * @param foot level of the lower edge, mm.
 */
export function buttonLevels(pen: Pen, first: number, bust: number, foot: number): readonly number[] {
  const spaces = Math.round(pen.value('buttonsToBust'))
  const even = (bust - first) / spaces
  const space = Math.max(even, nearest)
  if (space > even + 0.01) {
    pen.caution(
      'no-button-at-bust',
      `The neckline begins so near the bust that the buttons are set ${pen.say(space)} apart and none of them comes to lie at its level. Choose fewer spaces or a higher neck.`,
      'buttonsToBust',
      'frontNeckDrop',
    )
  }
  const levels: number[] = []
  for (let y = first; y <= foot - Math.min(aboveFoot, space / 2); y += space) levels.push(y)
  return levels
}
