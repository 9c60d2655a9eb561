import { useMemo } from 'react'
import { svgNumber, svgPath } from '@/drafting/drawing/svg-path'
import type { LaidOut, TilePage, Tiling } from '@/drafting/drawing'

/** The sheets as they lie taped on a table: paper, joins, the safe edge, and the pieces across them. Paper is white in any theme. */
export function PrintPreview({ laidOut }: { readonly laidOut: LaidOut }) {
  const { tiling, outlines } = laidOut
  const printed = useMemo(() => tiling.pages.filter((page) => !page.blank), [tiling])
  const box = boxAround(printed, tiling)
  const label = `${printed.length} sheets in ${tiling.rows} rows and ${tiling.columns} columns`
  return (
    <svg
      viewBox={[box.x, box.y, box.width, box.height].map(svgNumber).join(' ')}
      role="img"
      aria-label={label}
      className="block max-h-[60dvh] w-full"
      fill="none"
    >
      {printed.map((page) => (
        <rect
          key={page.name}
          {...paperOf(page, tiling)}
          fill="#fff"
          stroke="#cfc7b6"
          strokeWidth={1}
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {printed.map((page) => (
        <rect
          key={page.name}
          {...ownPart(page, tiling)}
          fill="#fff"
          stroke="#b9ae98"
          strokeWidth={1}
          strokeDasharray="3 3"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {outlines.map((outline, index) => (
        <path
          key={index}
          d={svgPath(outline)}
          stroke="#1b2140"
          strokeWidth={1.5}
          strokeLinejoin="round"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {printed.map((page) => (
        <text
          key={page.name}
          x={page.window.x + page.window.width / 2}
          y={page.window.y + page.window.height / 2}
          fontSize={box.width / 42}
          fill="#5f5446"
          textAnchor="middle"
          dominantBaseline="central"
        >
          {page.name}
        </text>
      ))}
    </svg>
  )
}

interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

function paperOf({ window }: TilePage, { margin, width, height }: Tiling): Box {
  return { x: window.x - margin, y: window.y - margin, width, height }
}

/** What of a page stays in sight once the sheets are trimmed and taped: to the join where there is a neighbour, else to the safe edge. */
function ownPart(page: TilePage, { overlap }: Tiling): Box {
  const { x, y, width, height } = page.window
  const half = (side: 'left' | 'right' | 'top' | 'bottom') =>
    page.marks.some((mark) => mark.side === side) ? overlap / 2 : 0
  return {
    x: x + half('left'),
    y: y + half('top'),
    width: width - half('left') - half('right'),
    height: height - half('top') - half('bottom'),
  }
}

function boxAround(pages: readonly TilePage[], tiling: Tiling): Box {
  const papers = pages.map((page) => paperOf(page, tiling))
  const x = Math.min(...papers.map((paper) => paper.x)) - 8
  const y = Math.min(...papers.map((paper) => paper.y)) - 8
  return {
    x,
    y,
    width: Math.max(...papers.map((paper) => paper.x + paper.width)) + 8 - x,
    height: Math.max(...papers.map((paper) => paper.y + paper.height)) + 8 - y,
  }
}
