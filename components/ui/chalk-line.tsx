/** A French-curve stroke with its tape ticks: decoration only. */
export function ChalkLine({ className }: { readonly className?: string }) {
  return (
    <svg viewBox="0 0 160 48" className={className} fill="none" stroke="currentColor" aria-hidden>
      <path d="M8 40C30 40 38 10 70 10s44 24 82 26" strokeWidth="1.5" strokeDasharray="7 4" />
      <path d="M8 40h144" strokeWidth="1" opacity=".6" />
      {Array.from({ length: 17 }, (_, tick) => (
        <path
          key={tick}
          d={`M${8 + tick * 9} 40v${tick % 8 === 0 ? -7 : tick % 4 === 0 ? -5 : -3}`}
          opacity=".6"
        />
      ))}
    </svg>
  )
}
