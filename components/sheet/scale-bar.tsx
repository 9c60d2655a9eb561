/** Steps that a scale bar may show, mm. */
const steps = [10, 20, 50, 100, 200, 500, 1000]

/** How long a piece of the drawing is: a bar of a round length, and the way the grain runs. */
export function ScaleBar({ scale }: { readonly scale: number }) {
  const length = steps.find((step) => step * scale >= 48) ?? 1000
  const words = length >= 1000 ? '1 m' : `${length / 10} cm`
  return (
    <div
      className="pointer-events-none absolute bottom-3 left-3 flex items-end gap-4 text-tag text-walnut"
      aria-hidden
    >
      <div>
        <span className="measure">{words}</span>
        <svg
          width={Math.round(length * scale) + 2}
          height="8"
          fill="none"
          stroke="currentColor"
          className="block"
        >
          <path d={`M1 1v6h${Math.round(length * scale)}v-6`} />
        </svg>
      </div>
      <div className="flex items-center gap-1.5">
        <svg width="9" height="26" viewBox="0 0 9 26" fill="none" stroke="currentColor">
          <path d="M4.5 1v24M1 5l3.5-4L8 5M1 21l3.5 4L8 21" />
        </svg>
        grain
      </div>
    </div>
  )
}
