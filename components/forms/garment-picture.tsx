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

/** A plain skirt or bodice stands for garments that have no drawing of their own yet. */
const plainSkirt = ['M40 30H80V40H40Z', 'M40 40C36 56 34 70 34 84V144H86V84C86 70 84 56 80 40']
const plainBodice = [
  'M44 20C50 30 70 30 76 20L92 28C86 44 88 56 94 66C92 88 88 106 84 122H36C32 106 28 88 26 66C32 56 34 44 28 28Z',
  'M50 122L54 92M70 122L66 92',
]

function pictureOf(garment: string): readonly string[] {
  return pictures[garment] ?? (garment.includes('skirt') ? plainSkirt : plainBodice)
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
      {pictureOf(garment).map((path, index) => (
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
