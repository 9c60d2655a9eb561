import { figurePlaces } from './figure-places'

const half =
  'M100 11C113 11 122 21 122 38C122 52 114 66 108 69C107.5 74 108 79 113 83C124 90 138 91 144 98' +
  'C150 106 153 126 156 146C159 164 162 178 163.5 192C166 214 171 238 172 262C175 270 178 280 175 294C173 300 168 300 166 294' +
  'C164 284 163 272 163 262C160 240 154 214 152 194C148 176 141 152 134 133C135 140 138 146 136.5 152C134 160 132 166 131 172' +
  'C129 184 126 192 126 200C128 212 135 226 138 238C141 250 141 262 139.5 280C137 318 128 346 127 380C130 400 129 420 124 444' +
  'C120 460 116 472 115 484C117 492 124 496 124 500L105 500C104 494 105 488 105 482C104 462 103 440 104.5 416C103 400 102.5 392 103.5 380' +
  'C102.5 344 101.5 310 100 278'

/**
 * Our figure, from the front. The measurement in focus is drawn on it; what lies behind is dashed.
 * Decorative: the words beside it say how each is taken.
 */
export function Figure({
  focused,
  className,
}: {
  readonly focused: string | undefined
  readonly className?: string
}) {
  const place = focused ? figurePlaces[focused] : undefined
  return (
    <svg viewBox="0 0 200 520" className={className} fill="none" aria-hidden>
      <g stroke="var(--walnut)" strokeWidth="1.25" strokeLinejoin="round" fill="var(--sheet)">
        <path d={`${half}L100 11Z`} stroke="none" />
        <path d={`${half}L100 11Z`} stroke="none" transform="matrix(-1 0 0 1 200 0)" />
        <path d={half} fill="none" />
        <path d={half} fill="none" transform="matrix(-1 0 0 1 200 0)" />
      </g>
      <g stroke="var(--rule)" strokeWidth="0.75" opacity="0.8">
        <path d="M87 82C91 90 109 90 113 82M74 200.5C90 205 110 205 126 200.5M14 500H186" />
        <path d="M100 92V276" strokeDasharray="6 3 1 3" />
      </g>
      {place && (
        <g stroke="var(--indigo)" strokeWidth="2.5" strokeLinecap="round" data-place={focused}>
          <path d={place.d} strokeDasharray={place.behind ? '4 4' : undefined} />
        </g>
      )}
    </svg>
  )
}
