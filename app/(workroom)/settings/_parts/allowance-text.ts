import type { Length } from '@/db/shapes/length'

/** An allowance as it stands in its field: as it was typed, and with its unit. */
export function allowanceText({ typed, unit }: Length): string {
  return /[a-z'"″′]/i.test(typed) ? typed : `${typed} ${unit}`
}
