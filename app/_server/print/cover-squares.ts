import 'server-only'
import { stretchOf, trueMeasure } from '@/drafting/drawing'
import type { Join, Measured, Style } from '@/drafting/drawing'
import type { CoverContext } from './cover-page'
import { drawMap } from './page-map'
import type { PageContent } from './page-content'

const square: Style = { stroke: 'ink', width: 0.25 }
const inner = 5
const size = 3.5
const leading = 4.5

const howToPrint = [
  'Print this page alone first. In the print window choose “Actual size” or 100\u00a0%, never “Fit to page”.',
  'Measure this square along the middle of its lines, both ways: each side is 10\u00a0cm. Each side of the square below is 4\u00a0in.',
  'If it measures something else, say 9.85 cm across and 9.92 cm down, enter both where you downloaded this pattern (“My printer is off”) and print its first page again: the pattern is then drawn so much larger.',
  'If a side is off by more than 5\u00a0mm, the page was made to fit: look for “Actual size” again.',
  'When both squares are right, print the rest the same way.',
]

/** What this copy was corrected for, so that nobody corrects it twice or prints it elsewhere. */
function correction({ short, long }: Measured): readonly string[] {
  if (short === 100 && long === 100) return []
  return [
    `This copy is corrected for a printer that makes ${cm(short)} of 10\u00a0cm across the paper and ${cm(long)} along it. On any other printer it is wrong.`,
  ]
}

const cm = (mm: number) => `${Math.round(mm * 10) / 100}\u00a0cm`

const howToTape: Readonly<Record<Join, readonly string[]>> = {
  trim: [
    'Trim the solid line on the left and top of each sheet, lay it up to the dashed line of its neighbour so that circles with the same name close, and tape.',
  ],
  butt: [
    'Trim every solid line, lay the sheets edge to edge so that the halves of circles with the same name meet, and tape both sides.',
  ],
}

/** The two squares that prove the scale, with what to do about it written inside. Returns the lower end of the second. */
export function drawSquares(
  content: PageContent,
  context: CoverContext,
  at: { x: number; y: number },
): number {
  const { measured = trueMeasure } = context
  // The page always lies upright, so that the paper's short side goes across.
  const { x: wide, y: high } = stretchOf(measured, 'full', 'portrait')
  content.boxes([at], 100 * wide, 100 * high, square)
  content.text('10 cm on each side', { x: at.x + inner, y: at.y + 10 }, { size: 5, weight: 600 })
  drawSteps(
    content,
    context,
    [...correction(measured), ...howToPrint],
    { x: at.x + inner, y: at.y + 18 },
    100 - 2 * inner,
  )

  const below = { x: at.x, y: at.y + 100 * high + 5 }
  content.boxes([below], 101.6 * wide, 101.6 * high, square)
  content.text('4 in on each side', { x: below.x + inner, y: below.y + 10 }, { size: 5, weight: 600 })
  const lines = howToTape[context.tiling.join].flatMap((text) =>
    context.type.wrap(text, size, 101.6 - 2 * inner),
  )
  const y = content.lines(lines, { x: below.x + inner, y: below.y + 17 }, leading, { size })
  const room = { width: 101.6 - 2 * inner, height: below.y + 101.6 - inner - y }
  drawMap(
    content,
    context.tiling,
    { x: below.x + inner, y },
    { ...room, names: true, outlines: context.outlines },
  )
  return below.y + 101.6 * high
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
