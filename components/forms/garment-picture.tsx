import type { Picture } from '@/drafting/sketch/picture'

/** A flat drawing of a garment, made by the engine from its own pieces. Decoration: its name stands beside it. */
export function GarmentPicture({
  picture,
  className,
}: {
  readonly picture: Picture
  readonly className?: string
}) {
  return (
    <svg
      viewBox={picture.viewBox}
      className={className}
      stroke="currentColor"
      strokeWidth="1.5"
      strokeLinejoin="round"
      strokeLinecap="round"
      aria-hidden
    >
      {picture.lines.map(({ kind, d }, index) => (
        <path
          key={index}
          d={d}
          vectorEffect="non-scaling-stroke"
          fill={kind === 'shape' ? 'var(--sheet)' : 'none'}
          strokeDasharray={kind === 'inner' ? '3 3' : undefined}
          opacity={kind === 'inner' ? 0.7 : 1}
        />
      ))}
    </svg>
  )
}
