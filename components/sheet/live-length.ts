import type { Point } from '@/drafting/contract'
import { typesetFractions } from '@/drafting/drawing/typeset'

/** Shows the lengths that a drag is changing, beside the pointer; nothing hides it. Written straight to the page, frame by frame. */
export function showLive(chip: HTMLElement | null, words: string | undefined, at?: Point): void {
  if (!chip) return
  chip.hidden = words === undefined
  if (words === undefined) return
  chip.textContent = typesetFractions(words)
  if (at) chip.style.transform = `translate(${Math.round(at.x + 16)}px, ${Math.round(at.y + 16)}px)`
}
