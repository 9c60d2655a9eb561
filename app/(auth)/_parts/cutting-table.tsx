import { typeset } from '@/components/ui/typeset'

/** A quarter of a dress marked on folded cloth, the way the first steps of a draft look. Ours; a picture, not a pattern. */
const outline =
  'M96 96 C104 132 128 150 164 152 M96 96 L196 74 M96 96 C96 118 82 134 60 136 M60 136 V560 M196 74 C190 108 178 132 178 158 C178 176 190 190 214 194 M214 194 C226 300 268 440 318 540 M318 540 C240 580 150 592 60 592'

const tags = [
  { x: 130, y: 66, text: '15 3/8 ÷ 2 = 7 11/16', turn: -12 },
  { x: 226, y: 140, text: '36 1/4 ÷ 6 + 1 1/2 ≈ 7 1/2', turn: 0 },
  { x: 286, y: 372, text: '22 1/2°', turn: 0 },
  { x: 76, y: 330, text: 'fold', turn: 0 },
] as const

/** Decoration beside the forms for people who are not signed in. */
export function CuttingTable() {
  return (
    <svg viewBox="0 0 460 660" className="h-full max-h-180 w-full text-ink" fill="none" aria-hidden>
      <g stroke="var(--rule)" strokeOpacity=".5">
        <path d="M60 40V630" strokeWidth="1.4" strokeDasharray="16 5 3 5" />
        {Array.from({ length: 73 }, (_, tick) => (
          <path key={tick} d={`M40 ${52 + tick * 8}h${tick % 8 === 0 ? -16 : tick % 4 === 0 ? -11 : -7}`} />
        ))}
        <path d="M40 52v576" />
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
      <path
        d="M60 592C150 592 240 580 318 540"
        stroke="var(--madder)"
        strokeWidth="1.6"
        strokeDasharray="7 5"
        transform="translate(0 -22)"
      />
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
            {typeset(text)}
          </text>
        ))}
      </g>
    </svg>
  )
}
