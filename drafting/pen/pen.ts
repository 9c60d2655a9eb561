import type { Caution, DesignChoice, Fit, Notion, Path, Problem, Run, SeamCheck, Unit } from '../contract'
import { DraftingError } from '../drafting-error'
import type { Corrections } from './corrections'
import { nothing, type Mask } from './masks'
import { PiecePen } from './piece-pen'
import type { StepRecord } from './step-record'
import type { Values } from './values'

/** A seam as the garment states it; lengths and notches are worked out when the pieces are finished. */
export interface SeamPlan {
  readonly id: string
  readonly name: string
  readonly a: readonly Run[]
  readonly b: readonly Run[]
  readonly join?: SeamCheck['join']
  /** Rule or style value that gives the ease; none means 0. */
  readonly easeFrom?: string
  /** mm from each side's start that must fall together, beside both ends. */
  readonly matches?: readonly { readonly a: number; readonly b: number }[]
  readonly ticks?: 1 | 2
  readonly smooth?: boolean
}

/** A tag on the drawing between two marks, or two free points of a piece. */
export interface TagPlan {
  readonly piece: string
  readonly from: string
  readonly to: string
  readonly label: string
  /** Style value that the tag is the input for; without one it only shows a result. */
  readonly value?: string
  /** The part of the length that the body gives: what is typed is this much more than the style value, mm. */
  readonly over?: number
  readonly step?: string
  readonly edge?: string
}

/** Draws a whole draft: its pieces, the seams that join them, how they fit, and what there is to say about it. */
export class Pen {
  readonly pieces: PiecePen[] = []
  readonly steps: StepRecord[] = []
  readonly seams: SeamPlan[] = []
  readonly fits: Fit[] = []
  readonly tags: TagPlan[] = []
  readonly notions: Notion[] = []
  readonly cautions: Caution[] = []
  private readonly problems: Problem[] = []
  private trail: Mask | undefined

  constructor(
    readonly values: Values,
    readonly corrections: Corrections,
    readonly unit: Unit,
    /** Chalk guide: every distance that is measured with the tape is rounded to so many mm. */
    readonly tape: number | undefined,
    readonly explains: boolean,
  ) {}

  /**
   * Begins a piece.
   *
   * @param fixed why no correction can move any of its marks, and what to correct instead.
   */
  piece(id: string, name: string, fixed?: string): PiecePen {
    const piece = new PiecePen(this, id, name, fixed)
    this.pieces.push(piece)
    return piece
  }

  /** The number behind a rule, measurement, style or found value; not rounded. */
  value(name: string): number {
    if (this.trail !== undefined) this.heed(this.values.mask(name))
    return this.values.number(name)
  }

  /**
   * Runs a construction and gathers what it follows from: every name whose number it asks for, and all that the marks and
   * edges follow from that it looks at. What it makes need not list its sources by hand, and cannot forget one.
   */
  follow<T>(construct: () => T): { readonly made: T; readonly uses: Mask } {
    const outer = this.trail
    this.trail = nothing
    const made = construct()
    const uses = this.trail
    this.trail = outer === undefined ? undefined : outer | uses
    return { made, uses }
  }

  /** Adds to what the construction being followed depends on. */
  heed(uses: Mask): void {
    if (this.trail !== undefined) this.trail |= uses
  }

  /** A length as it is measured out, mm: rounded to the tape when there is one. Refuses a negative one. */
  length(name: string): number {
    const value = this.value(name)
    if (value < -1e-9) {
      this.refuse({
        field: name,
        code: 'impossible-shape',
        message: `“${name}” comes to ${(value / 10).toFixed(1)} cm. A length that is measured out cannot be less than nothing: change the formula or what it is made from.`,
        min: 0,
      })
    }
    return this.onTape(value)
  }

  /** A length as it is measured out, mm: rounded one way to the tape when there is one. */
  lengthRounded(name: string, way: 'up' | 'down'): number {
    const value = this.length(name)
    const exact = this.values.number(name)
    if (!this.tape) return value
    if (way === 'up' && value < exact - 1e-9) return value + this.tape
    return way === 'down' && value > exact + 1e-9 ? value - this.tape : value
  }

  /** Whether a measurement is known or could be estimated. */
  has(name: string): boolean {
    return this.values.numbers[name] !== undefined
  }

  /** Rounds to the tape, when there is one. */
  onTape(length: number): number {
    return this.tape ? Math.round(length / this.tape) * this.tape : length
  }

  /** An allowance, mm. Allowances are cut, not measured along the body, so the tape leaves them alone. */
  allowance(name: string): number {
    return this.values.number(name)
  }

  chosen(id: string): DesignChoice {
    return this.values.chosen(id)
  }

  /** A choice of the style that not every garment offers. */
  offered(id: string): DesignChoice | undefined {
    return this.values.offered(id)
  }

  /** States a value found so that something fits, with the sum of what it follows from. */
  find(name: string, value: number, uses: Mask): void {
    this.values.find(name, value, uses)
  }

  /** States a found value anew; every rule that was worked out with the old one is worked out again. */
  refind(name: string, value: number, uses: Mask): void {
    this.values.forget()
    this.values.find(name, value, uses)
  }

  /** What names follow from, joined. */
  usesOf(names: readonly string[]): Mask {
    let mask = nothing
    for (const name of names) mask |= this.values.mask(name)
    return mask
  }

  note(step: StepRecord): void {
    this.steps.push(step)
  }

  sew(plan: SeamPlan): void {
    this.seams.push(plan)
  }

  fit(fit: Fit): void {
    this.fits.push(fit)
  }

  tag(plan: TagPlan): void {
    this.tags.push(plan)
  }

  notion(notion: Notion): void {
    this.notions.push(notion)
  }

  caution(code: string, message: string, ...fields: readonly string[]): void {
    this.cautions.push({ code, message, fields })
  }

  /** Notes a reason why this cannot be drafted and goes on looking for others. */
  doubt(problem: Problem): void {
    this.problems.push(problem)
  }

  /** Stops here if anything was found impossible. Call before drawing what would come out nonsense. */
  settle(): void {
    if (this.problems.length) throw new DraftingError(this.problems)
  }

  /** Stops at once. */
  refuse(problem: Problem): never {
    throw new DraftingError([...this.problems, problem])
  }

  /** A length in the order's unit, for messages. */
  say(mm: number): string {
    return this.unit === 'in' ? `${(mm / 25.4).toFixed(1)} in` : `${(mm / 10).toFixed(1)} cm`
  }
}

/** A fit measured across paths of pieces. */
export function fitAcross(
  id: string,
  relation: Fit['relation'],
  ease: number,
  body: number | undefined,
  across: readonly { piece: string; path: Path; times: number; length: number }[],
): Fit {
  return {
    id,
    relation,
    ease,
    ...(body === undefined ? {} : { body }),
    length: across.reduce((sum, one) => sum + one.times * one.length, 0),
    across: across.map(({ piece, path, times }) => ({ piece, path, times })),
  }
}
