import 'server-only'
import type { Style } from '@/drafting/drawing'
import type { CoverContext } from './cover-page'
import { drawMap } from './page-map'
import type { PageContent } from './page-content'

const square: Style = { stroke: 'ink', width: 0.25 }
const inner = 5
const size = 3.5
const leading = 4.5

const howToPrint = [
  'Print this page alone first. In the print window choose “Actual size” or 100\u00a0%, never “Fit to page”.',
  'Measure this square along the middle of its lines: each side is 10\u00a0cm. Each side of the square below is 4\u00a0in.',
  'If it measures something else, say 9.8 cm, print at 100\u00a0×\u00a010\u00a0÷\u00a09.8\u00a0=\u00a0102\u00a0% and measure again.',
  'If width and height differ, the printer pulls the paper unevenly: try other paper or another printer.',
  'When both squares are right, print the rest the same way.',
]

const howToTape = [
  'Trim the solid line on the left and top of each sheet, lay it up to the dashed line of its neighbour so that circles with the same name close, and tape.',
]

/** The two squares that prove the scale, with what to do about it written inside. Returns the lower end of the second. */
export function drawSquares(
  content: PageContent,
  context: CoverContext,
  at: { x: number; y: number },
): number {
  content.boxes([at], 100, 100, square)
  content.text('10 cm on each side', { x: at.x + inner, y: at.y + 10 }, { size: 5, weight: 600 })
  drawSteps(content, context, howToPrint, { x: at.x + inner, y: at.y + 18 }, 100 - 2 * inner)

  const below = { x: at.x, y: at.y + 100 + 5 }
  content.boxes([below], 101.6, 101.6, square)
  content.text('4 in on each side', { x: below.x + inner, y: below.y + 10 }, { size: 5, weight: 600 })
  const lines = howToTape.flatMap((text) => context.type.wrap(text, size, 101.6 - 2 * inner))
  const y = content.lines(lines, { x: below.x + inner, y: below.y + 17 }, leading, { size })
  const room = { width: 101.6 - 2 * inner, height: below.y + 101.6 - inner - y }
  drawMap(
    content,
    context.tiling,
    { x: below.x + inner, y },
    { ...room, names: true, outlines: context.outlines },
  )
  return below.y + 101.6
}

function drawSteps(
  content: PageContent,
  context: CoverContext,
  steps: readonly string[],
  at: { x: number; y: number },
  width: number,
): void {
  let y = at.y
  steps.forEach((step, index) => {
    content.text(String(index + 1), { x: at.x, y }, { size, weight: 600, dye: 'indigo' })
    const lines = context.type.wrap(step, size, width - 5)
    y = content.lines(lines, { x: at.x + 5, y }, leading, { size }) + 1.6
  })
}
