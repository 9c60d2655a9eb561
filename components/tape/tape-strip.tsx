/** A drawn tailor's tape hanging down the side of a list: ticks of an eighth, numbers each inch or centimetre of its own. */
export function TapeStrip({ className }: { readonly className?: string }) {
  return (
    <div aria-hidden className={className}>
      <svg width="100%" height="100%" className="block">
        <defs>
          <pattern id="tape-ticks" width="40" height="72" patternUnits="userSpaceOnUse">
            {Array.from({ length: 8 }, (_, tick) => (
              <path
                key={tick}
                d={`M0 ${tick * 9 + 0.5}h${tick === 0 ? 18 : tick === 4 ? 12 : 7}`}
                stroke="var(--rule)"
                strokeWidth="1"
              />
            ))}
          </pattern>
        </defs>
        <rect width="100%" height="100%" fill="url(#tape-ticks)" />
      </svg>
    </div>
  )
}
