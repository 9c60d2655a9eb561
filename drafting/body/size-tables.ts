import { astmD5585 } from './sizes/astm-d5585'
import { en13402 } from './sizes/en-13402-3'
import { jisL4005 } from './sizes/jis-l-4005'
import type { SizeTable } from './sizes/size-table'

/** The published size tables, for a card that starts from a size instead of a client, and for checks. */
export const sizeTables: readonly SizeTable[] = [astmD5585, en13402, jisL4005]
