import type { DesignChoice, DesignValue } from './contract'

/** Choices that rule out another, and why. */
export interface Combination {
  readonly garments: readonly string[]
  /** What is chosen. */
  readonly when: Readonly<Record<string, readonly DesignChoice[]>>
  /** What is then not offered. */
  readonly not: { readonly id: string; readonly is: readonly DesignChoice[] }
  /** Why, and what to do instead. */
  readonly why: string
}

const zipInPocket =
  'The zip lies in the side seam, where the pocket would be. Put the zip at the centre back.'
const pocketOverPocket =
  'A patch pocket would be stitched over the bag of the pocket in the side seam. Choose one of them.'

/** Every combination of choices that is not offered. All others can be drafted. */
export const combinations: readonly Combination[] = [
  {
    garments: ['straight-skirt', 'a-line-skirt', 'gathered-skirt'],
    when: { opening: ['side zip'] },
    not: { id: 'pockets', is: [true] },
    why: zipInPocket,
  },
  {
    garments: ['flared-dress', 'shift-dress'],
    when: { backOpening: ['side zip'] },
    not: { id: 'pockets', is: [true] },
    why: zipInPocket,
  },
  {
    garments: ['gored-skirt'],
    when: { opening: ['side zip'], gores: [4] },
    not: { id: 'pockets', is: [true] },
    why: 'With four gores the zip lies in the seam where the pocket would be. Put the zip at the centre back, or choose more gores.',
  },
  {
    garments: ['circle-skirt'],
    when: { panels: [1], share: ['1/4', '1/2'] },
    not: { id: 'pockets', is: [true] },
    why: 'One panel has one seam, and the opening is in it. Choose two panels for pockets.',
  },
  {
    garments: ['straight-skirt', 'a-line-skirt', 'gathered-skirt', 'waist-seam-dress'],
    when: { patchPockets: [true] },
    not: { id: 'pockets', is: [true] },
    why: pocketOverPocket,
  },
  {
    garments: ['waist-seam-dress'],
    when: { skirt: ['circle'] },
    not: { id: 'share', is: ['1 1/2'] },
    why: 'Front and back are one piece each, and a piece of a circle spans at most half of it. Choose a whole circle or less, or a circle skirt by itself.',
  },
]

type Chosen = (id: string) => DesignChoice | undefined

/** Why a choice of a value is not offered with the others as they stand; undefined when it is. */
export function ruledOut(
  garment: string,
  id: string,
  choice: DesignChoice,
  chosen: Chosen,
): string | undefined {
  return combinations.find(
    (one) =>
      one.not.id === id &&
      one.not.is.includes(choice) &&
      one.garments.includes(garment) &&
      Object.entries(one.when).every(([other, is]) => {
        const now = chosen(other)
        return now !== undefined && is.includes(now)
      }),
  )?.why
}

/** All choices of a value, none where it is a number. */
export function choicesOf(value: DesignValue): readonly DesignChoice[] {
  if (value.kind === 'choice') return value.choices ?? []
  return value.kind === 'yes-no' ? [false, true] : []
}

/** The choices of a value that are offered with the others as they stand. */
export const offeredChoices = (
  garment: string,
  value: DesignValue,
  chosen: Chosen,
): readonly DesignChoice[] =>
  choicesOf(value).filter((choice) => !ruledOut(garment, value.id, choice, chosen))
