import type {
  DraftingMethod,
  DraftOrder,
  GarmentDefinition,
  MethodUse,
  OwnMeasurement,
} from '@/drafting/contract'
import type { Allowances } from '@/db/shapes/workroom'
import type { Length } from '@/db/shapes/length'

/** The workroom's allowances by the names that garments give theirs. */
const allowanceFields = {
  shoulder: 'shoulderAllowance',
  side: 'sideAllowance',
  centreBack: 'centreBackAllowance',
  neckline: 'neckAllowance',
  armhole: 'armholeAllowance',
  hem: 'hemAllowance',
} as const satisfies Record<keyof Allowances, string>

/** Measurements to draft on: a card's, with what was typed, or a published size's. */
export interface Body {
  readonly unit: 'in' | 'cm'
  readonly values: Readonly<Record<string, Length | { readonly mm: number }>>
}

/** What the workroom brings to a draft beside the body. */
export interface Custom {
  readonly allowances: Allowances
  /** The drafting method chosen; a workroom's own has a version. */
  readonly method?: DraftingMethod & { readonly version?: number }
  /** Measurements that the workroom takes and the engine does not know. */
  readonly own?: readonly OwnMeasurement[]
}

/**
 * The order a draft starts from: every measurement of the card, the workroom's allowances where the garment has them and takes them, and the
 * garment's own defaults for the rest. The rules of the drafting method are copied, so that the draft stays as it is when the
 * method changes. Texts stay as they were typed.
 */
export function firstOrder(
  garment: GarmentDefinition,
  card: Body,
  { allowances, method, own = [] }: Custom,
): { readonly order: Omit<DraftOrder, 'corrections'>; readonly typed: Readonly<Record<string, string>> } {
  const measured = Object.entries(card.values)
  const taken = own.filter(({ id }) => Object.hasOwn(card.values, id))
  const usual = Object.entries(allowanceFields).flatMap(([where, id]) => {
    const value = garment.design.find((each) => each.id === id)
    const wanted = allowances[where as keyof Allowances]
    const within = value && wanted.mm >= (value.min ?? 0) && wanted.mm <= (value.max ?? Infinity)
    return within && wanted.mm !== value.default ? [[id, wanted] as const] : []
  })
  return {
    order: {
      garment: garment.id,
      measurements: Object.fromEntries(measured.map(([id, value]) => [id, value.mm])),
      design: Object.fromEntries(usual.map(([id, wanted]) => [id, wanted.mm])),
      rules: {},
      ...(method ? { method: methodUse(method, garment.id) } : {}),
      ...(taken.length > 0 ? { ownMeasurements: taken } : {}),
      unit: card.unit,
    },
    typed: Object.fromEntries([
      ...measured.flatMap(([id, value]) =>
        'typed' in value ? [[`measurements.${id}`, withUnit(value)] as const] : [],
      ),
      ...usual.map(([id, wanted]) => [`design.${id}`, withUnit(wanted)]),
    ]),
  }
}

/** The method as the order keeps it: its name and version, and its rules for this garment. */
function methodUse(method: NonNullable<Custom['method']>, garment: string): MethodUse {
  const { id, name, version, garments } = method
  return { id, name, ...(version === undefined ? {} : { version }), rules: garments[garment] ?? [] }
}

function withUnit({ typed, unit }: Length): string {
  return /[\d½⅓⅔¼¾⅛⅜⅝⅞]$/.test(typed) ? `${typed} ${unit}` : typed
}
