import { typesetFractions } from '@/drafting/drawing/typeset'

/** A quarter of a dress marked on folded cloth, the way the first steps of a draft look. Ours; a picture, not a pattern. */
const outline =
  'M60 136C82 134 96 118 96 96L196 74C190 108 178 132 178 158C178 176 190 190 214 194C226 300 268 440 318 540C240 580 150 592 60 592'

const tags = [
  { x: 130, y: 66, text: '15 3/8 ÷ 2 = 7 11/16', turn: -12 },
  { x: 226, y: 140, text: '36 1/4 ÷ 6 + 1 1/2 ≈ 7 1/2', turn: 0 },
  { x: 286, y: 372, text: '22 1/2°', turn: 0 },
  { x: 70, y: 366, text: 'fold', turn: 0 },
] as const

/** Decoration beside the forms for people who are not signed in. */
export function CuttingTable() {
  return (
    <svg viewBox="0 0 460 660" className="h-full max-h-180 w-full text-ink" fill="none" aria-hidden>
      <g stroke="var(--rule)" strokeOpacity=".5">
        <path
          d="M60 60V612"
          stroke="var(--ink)"
          strokeWidth="1.4"
          strokeOpacity=".8"
          strokeDasharray="16 5 3 5"
        />
        {Array.from({ length: 73 }, (_, tick) => (
          <path key={tick} d={`M26 ${52 + tick * 8}h${tick % 8 === 0 ? -16 : tick % 4 === 0 ? -11 : -7}`} />
        ))}
        <path d="M26 52v576" />
        <path d="M60 194H400 M60 96H330" strokeDasharray="2 6" />
        <path d="M196 74V250" strokeDasharray="2 6" />
      </g>
      <path
        d={outline}
        stroke="var(--indigo)"
        strokeWidth="2.4"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
      {/* The hem as it will be turned, and the edge of the neck facing. */}
      <g stroke="var(--madder)" strokeWidth="1.6" strokeDasharray="7 5">
        <path d="M60 570C146 570 228 560 306 516" />
        <path d="M60 172C98 168 126 138 130 89" />
      </g>
      <path d="M60 236h-14v250h14" stroke="var(--walnut)" />
      <path d="M150 300V480M150 300l-6 12M150 300l6 12M150 480l-6-12M150 480l6-12" stroke="var(--walnut)" />
      <g fill="var(--indigo)">
        {['96 96', '196 74', '214 194', '318 540', '60 136'].map((spot) => {
          const [x, y] = spot.split(' ')
          return <circle key={spot} cx={x} cy={y} r="4" />
        })}
      </g>
      <g fill="var(--walnut)" fontSize="15" className="measure">
        {tags.map(({ x, y, text, turn }) => (
          <text key={text} x={x} y={y} transform={`rotate(${turn} ${x} ${y})`}>
            {typesetFractions(text)}
          </text>
        ))}
      </g>
    </svg>
  )
}
