import type { ChalkSheet } from '@/drafting/chalk/guide'
import type { Piece } from '@/drafting/contract'
import { svgPath } from '@/drafting/drawing/svg-path'
import { bounds } from '@/drafting/geometry/path'
import { stitchLine } from '@/drafting/pieces/stitch-line'

/** A piece as it is chalked, with its letters: the line that is stitched, the line that is cut, and the layings of the tape. */
export function PieceSketch({ piece, sheet }: { readonly piece: Piece; readonly sheet: ChalkSheet }) {
  const { min, max } = bounds(piece.cutLine)
  const size = Math.max(max.x - min.x, max.y - min.y)
  const around = size * 0.06
  const box = [min.x - around, min.y - around, max.x - min.x + 2 * around, max.y - min.y + 2 * around]
  return (
    <svg
      viewBox={box.map((value) => value.toFixed(1)).join(' ')}
      className="block max-h-80 w-full"
      fill="none"
      role="img"
      aria-label={`${sheet.name} with its marks`}
    >
      <path
        d={svgPath(piece.cutLine)}
        className="stroke-walnut"
        strokeDasharray="4 3"
        vectorEffect="non-scaling-stroke"
      />
      <path
        d={svgPath(stitchLine(piece))}
        className="stroke-madder"
        strokeWidth={2}
        vectorEffect="non-scaling-stroke"
      />
      {sheet.layings.map(({ tape, marks }, index) => {
        const last = marks.at(-1)
        if (!tape || !last) return null
        return (
          <line
            key={index}
            x1={tape.from.x}
            y1={tape.from.y}
            x2={last.at.x}
            y2={last.at.y}
            className="stroke-indigo"
            strokeDasharray="2 3"
            vectorEffect="non-scaling-stroke"
          />
        )
      })}
      {sheet.layings
        .flatMap(({ marks }) => marks)
        .map(({ letter, at }) => (
          <text
            key={`${at.x} ${at.y}`}
            x={at.x + size * 0.008}
            y={at.y - size * 0.008}
            fontSize={size * 0.04}
            className="fill-ink font-semibold"
          >
            {letter}
          </text>
        ))}
    </svg>
  )
}
