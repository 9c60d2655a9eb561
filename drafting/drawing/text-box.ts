import type { DrawingItem, Point } from '../contract'
import { add, rotate } from '../geometry/point'

type Text = Extract<DrawingItem, { kind: 'text' }>

/** Average advance of Source Sans 3 in ems, rounded up: a box that the text surely fits. */
const advance = 0.54
const ascent = 0.75
const descent = 0.25

/** Width that a text surely fits, mm. */
export function textWidth(text: string, size: number): number {
  return text.length * advance * size
}

/** The four corners of the box around a text, clockwise from the top left as one reads it. */
export function textCorners(item: Text): readonly Point[] {
  const half = textWidth(item.text, item.size) / 2
  const top = -ascent * item.size
  const bottom = descent * item.size
  return [
    { x: -half, y: top },
    { x: half, y: top },
    { x: half, y: bottom },
    { x: -half, y: bottom },
  ].map((corner) => add(item.at, rotate(corner, item.turn)))
}
