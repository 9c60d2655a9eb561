const pictures: Readonly<Record<string, readonly string[]>> = {
  'flared-dress': [
    'M46 12C50 20 58 23 60 23S70 20 74 12L84 18C82 30 82 38 86 46C80 60 84 70 88 84C94 104 102 128 106 150C90 158 30 158 14 150C18 128 26 104 32 84C36 70 40 60 34 46C38 38 38 30 36 18Z',
    'M84 18C92 22 98 30 104 46L90 52L86 46M36 18C28 22 22 30 16 46L30 52L34 46',
    'M60 23V154',
  ],
  'circle-skirt': [
    'M42 26H78V36H42Z',
    'M42 36C34 66 18 104 6 130C14 142 26 136 34 142C44 148 52 142 60 146C68 142 76 148 86 142C94 136 106 142 114 130C102 104 86 66 78 36',
    'M50 36C46 76 40 112 34 142M60 36V146M70 36C74 76 80 112 86 142',
  ],
}

/** A flat drawing of a garment, our own. Decoration: its name stands beside it. */
export function GarmentPicture({
  garment,
  className,
}: {
  readonly garment: string
  readonly className?: string
}) {
  return (
    <svg
      viewBox="0 0 120 164"
      className={className}
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      strokeLinejoin="round"
      strokeLinecap="round"
      aria-hidden
    >
      {(pictures[garment] ?? []).map((path, index) => (
        <path
          key={path}
          d={path}
          strokeDasharray={index === 2 ? '5 4' : undefined}
          opacity={index === 2 ? 0.5 : 1}
        />
      ))}
    </svg>
  )
}
