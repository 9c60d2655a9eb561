/** Our mark: a chalk stroke that folds back on itself, the fold lightly dashed. */
export function Mark({ size = 28 }: { readonly size?: number }) {
  return (
    <svg viewBox="0 0 32 32" width={size} height={size} fill="none" aria-hidden className="shrink-0">
      <path
        d="M25 4.5v23"
        stroke="currentColor"
        strokeWidth="1.5"
        strokeDasharray="5 2.2 1.2 2.2"
        opacity=".65"
      />
      <path
        d="M3.5 22.5C9 8.5 17 6 25 10.2C17.5 12.6 10.5 18 8 27"
        stroke="currentColor"
        strokeWidth="3.4"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  )
}

/** The mark with the name. */
export function Wordmark() {
  return (
    <span className="flex items-center gap-2 text-lg font-semibold tracking-tight text-ink">
      <Mark />
      Chalkfold
    </span>
  )
}
