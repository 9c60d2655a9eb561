import type { Draft, DraftOrder, GarmentDefinition, Handle } from '@/drafting/contract'

/** One place where a draft breaks a law. */
export interface Violation {
  readonly law: number
  /** Piece, edge, seam, step or fit. */
  readonly where: string
  readonly message: string
}

/** What the laws ask of an engine, so that the same laws judge one that was broken on purpose. */
export interface Engine {
  readonly garments: readonly GarmentDefinition[]
  draftGarment(order: DraftOrder): Draft
  handles(order: DraftOrder): readonly Handle[]
}

/** Judges one finished draft of an order. */
export type DraftLaw = (draft: Draft, order: DraftOrder, engine: Engine) => Violation[]

/** Judges an order by drafting it again and again, a little changed each time. */
export type OrderLaw = (order: DraftOrder, engine: Engine) => Violation[]

/** Collects violations of one law. */
export class Findings {
  readonly all: Violation[] = []

  constructor(private readonly law: number) {}

  add(where: string, message: string): void {
    this.all.push({ law: this.law, where, message })
  }

  /** Adds a violation unless the value is at most `limit`; NaN is one too. */
  atMost(where: string, what: string, value: number, limit: number): void {
    if (!(value <= limit)) this.add(where, `${what}: ${shown(value)}, at most ${shown(limit)} allowed`)
  }
}

function shown(value: number): string {
  return Number.isFinite(value) ? String(Number(value.toPrecision(7))) : String(value)
}
