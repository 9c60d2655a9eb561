import type { Card } from '../card'

/** seen: read in the named source; memory: recalled, to be verified; derived: worked out from rules that were read. */
export type FigureStatus = 'seen' | 'memory' | 'derived'

export interface PublishedSize {
  /** Unique over all tables: 'astm-d5585-12-curvy'. */
  readonly id: string
  readonly name: string
  /** mm, only what the table gives; `completeCard` fills in the rest. */
  readonly card: Card
}

export interface SizeTable {
  readonly id: string
  readonly name: string
  readonly source: string
  /** By measurement. */
  readonly status: Readonly<Record<string, FigureStatus>>
  readonly sizes: readonly PublishedSize[]
}
