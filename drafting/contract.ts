/**
 * The agreement between the drafting engine and everything else: canvas, prints, tests. Types only.
 *
 * Millimetres, degrees, square millimetres. x grows to the right, y grows down the body. All body pieces of a draft share
 * one frame: x = 0 is the centre, y = 0 the level of the side neck point. "Clockwise" means
 * Σ(xᵢ·yᵢ₊₁ − xᵢ₊₁·yᵢ) > 0 in this frame. Ids are stable across sizes, values of a choice, and redraws.
 */

export interface Point {
  readonly x: number
  readonly y: number
}

export interface LineSegment {
  readonly kind: 'line'
  readonly from: Point
  readonly to: Point
}

export interface CubicSegment {
  readonly kind: 'cubic'
  readonly from: Point
  readonly control1: Point
  readonly control2: Point
  readonly to: Point
}

export type Segment = LineSegment | CubicSegment

/** Segments in order; each starts at exactly (===) the coordinates where the one before it ends. */
export interface Path {
  readonly segments: readonly Segment[]
  readonly closed: boolean
}

export type EdgeRole =
  'seam' | 'fold' | 'hem' | 'neckline' | 'armhole' | 'waist' | 'opening' | 'dart' | 'free'

/**
 * How the cut line turns the corner where an edge starts.
 * - mitre: both allowances run on until they meet (limited to 2.5 × the larger)
 * - square: cut square across the seam
 * - turned: the neighbour's cut line mirrored in the hem, so that it meets the seam when the hem is turned up
 * - step: a right-angled step between two different allowances on a smooth join
 */
export type Corner = 'mitre' | 'square' | 'turned' | 'step'

/** One side of a piece, between two corners. The edges in order make its closed stitch line, clockwise. */
export interface Edge {
  /** Unique in its piece: 'side', 'shoulder', 'centre-front'… */
  readonly id: string
  readonly role: EdgeRole
  /** Open. */
  readonly path: Path
  /** mm; 0 on a fold. */
  readonly allowance: number
  readonly startCorner: Corner
  /** This edge's own stretch of the cut line, its start corner included. */
  readonly cut: Path
  /** What becomes of the edge when the garment is sewn. */
  readonly finish: 'seam' | 'fold' | 'turned' | 'bound' | 'free'
  /** Id of the step that drew it. */
  readonly madeBy: string
}

export interface Notch {
  readonly id: string
  readonly edge: string
  /** mm along the edge. */
  readonly at: number
  /** One for front, two for back. */
  readonly ticks: 1 | 2
}

export interface Mark {
  readonly id: string
  readonly letter?: string
  readonly at: Point
  readonly kind: 'construction' | 'drill' | 'button' | 'end'
  /** Why no correction can move it, and what to correct instead. */
  readonly fixed?: string
}

export interface Dart {
  readonly id: string
  readonly legs: readonly [Path, Path]
  readonly point: Point
  readonly edges?: readonly [string, string]
  readonly pressTo: 'centre' | 'side' | 'down' | 'up'
  readonly intake: number
}

export interface InnerLine {
  readonly id: string
  readonly kind: 'level' | 'turn' | 'gather' | 'placement' | 'pleat'
  readonly path: Path
}

/** What to cut from one cloth. `handed`: half of the count are mirror images (count 2 handed = a left and a right). */
export interface Cutting {
  readonly cloth: 'main' | 'interfacing' | 'lining'
  readonly count: number
  readonly onFold: boolean
  readonly handed: boolean
}

export interface Piece {
  /** Unique in its draft: 'front', 'back', 'sleeve', 'front-neck-facing', 'pocket-bag'… */
  readonly id: string
  readonly name: string
  readonly edges: readonly Edge[]
  /** Closed, clockwise: the edges' `cut` in order. */
  readonly cutLine: Path
  readonly grain: { readonly from: Point; readonly to: Point }
  readonly notches: readonly Notch[]
  readonly marks: readonly Mark[]
  /** A dart on an edge is part of the outline too (two edges of role 'dart'); one inside stands only here. */
  readonly darts: readonly Dart[]
  readonly lines: readonly InnerLine[]
  readonly cut: readonly Cutting[]
}

/** A stretch of an edge in a seam, in sewing order. `from`/`to` are mm along the edge; the whole edge when absent. */
export interface Run {
  readonly piece: string
  readonly edge: string
  readonly from?: number
  readonly to?: number
  readonly reversed?: boolean
  readonly mirrored?: boolean
}

/** Two runs that are sewn together. Notches are generated from `matches`. */
export interface SeamCheck {
  readonly id: string
  readonly name: string
  readonly a: readonly Run[]
  readonly b: readonly Run[]
  readonly join: 'plain' | 'eased' | 'gathered' | 'faced'
  /** mm: a is meant to be this much longer than b. */
  readonly ease: number
  /** The rule or design value the ease comes from; without one it is 0. */
  readonly easeFrom?: string
  /** length(a) − length(b) − ease, mm. */
  readonly difference: number
  /** mm from each side's start that must fall together. */
  readonly matches: readonly { readonly a: number; readonly b: number }[]
  /** The edges that this seam joins run on without a corner across it. */
  readonly smooth: boolean
}

/** One mark, line or construction with the sum behind it: what a tutor would say and a student would check. */
export interface Step {
  readonly id: string
  readonly piece: string
  /** solve: a value found so that something fits. */
  readonly kind: 'mark' | 'line' | 'curve' | 'level' | 'turn' | 'copy' | 'solve'
  /** 'From the shoulder line come down the armhole depth' */
  readonly text: string
  /** The mark it is measured from. */
  readonly from?: string
  readonly direction?: Point
  /** Marks it makes. */
  readonly marks: readonly string[]
  /** At most one edge a step. */
  readonly edge?: string
  /** 'armholeDepth' */
  readonly rule?: string
  /** 'bust / 6 + 1.5in' */
  readonly formula?: string
  /** '35 ÷ 6 + 1 1/2 ≈ 7 3/8', in the order's unit; ≈ where the result was rounded. */
  readonly arithmetic?: string
  /** mm, unrounded. */
  readonly length?: number
  /** mm: depth of a curve at its middle. */
  readonly sagitta?: number
  /** Measurements, design values and rules that it depends on. */
  readonly uses: readonly string[]
  readonly draws: readonly Path[]
}

/** A tag on the drawing, in drafting order (= Tab order). Only `shows: 'value'` is an input. */
export interface Dimension {
  readonly id: string
  readonly piece: string
  readonly from: Point
  readonly to: Point
  readonly label: string
  readonly length: number
  readonly shows: 'value' | 'result'
  readonly value?: string
  /** mm that the body gives before the style value counts: typing a length sets the value to that length less this. */
  readonly over?: number
  readonly step?: string
  readonly edge?: string
}

/** One direction in which a handle moves: 1 mm along the unit vector `along` changes `value` by `perMm`. */
export interface HandleMove {
  readonly value: string
  readonly along: Point
  readonly perMm: number
}

/** A mark that may be dragged, with one or two moves, valid near the current draft: a drag re-solves as it goes. */
export interface Handle {
  readonly id: string
  readonly piece: string
  readonly mark: string
  readonly at: Point
  readonly moves: readonly HandleMove[]
}

/** How a finished girth or length fits the body, measured off the drawn pieces (darts closed, no allowances). */
export interface Fit {
  /** 'bust', 'waist', 'hip', 'biceps', 'wrist', 'neck', 'hem', 'length'… */
  readonly id: string
  /** mm */
  readonly body?: number
  /** mm asked for. */
  readonly ease: number
  /** mm = Σ times × length(across). */
  readonly length: number
  readonly relation: 'equal' | 'at-least' | 'shown'
  readonly across: readonly { readonly piece: string; readonly path: Path; readonly times: number }[]
}

export interface Caution {
  readonly code: string
  readonly message: string
  readonly fields: readonly string[]
}

export interface Notion {
  readonly kind: string
  readonly length?: number
  readonly count?: number
}

export interface Draft {
  readonly engineVersion: string
  readonly garment: string
  readonly pieces: readonly Piece[]
  readonly seams: readonly SeamCheck[]
  readonly steps: readonly Step[]
  readonly dimensions: readonly Dimension[]
  readonly fits: readonly Fit[]
  /** Every measurement the draft used. */
  readonly used: Readonly<Record<string, { readonly mm: number; readonly estimatedBy?: string }>>
  readonly notions: readonly Notion[]
  readonly cautions: readonly Caution[]
}

/** A stated change on top of the rules, applied when the mark is placed or the seam closed. */
export interface Correction {
  readonly id: string
  readonly on:
    | { readonly piece: string; readonly mark: string }
    /** level: mm below the side neck. */
    | { readonly seam: string; readonly level: number }
  /** A point moves; a seam is taken in by so many mm on each layer (negative: let out). */
  readonly by: Point | number
  readonly off?: boolean
  readonly note?: string
}

/** A named fit remedy, and by how much: it moves everything that the remedy names, together. */
export interface RemedyUse {
  readonly id: string
  /** mm, within the remedy's range. */
  readonly amount: number
  readonly off?: boolean
}

/** A usual misfit and what is done about it. */
export interface RemedyDefinition {
  readonly id: string
  readonly name: string
  /** What is seen on the body. */
  readonly see: string
  /** What the amount is, and what moves with it. */
  readonly does: string
  readonly source: string
  /** mm */
  readonly default: number
  readonly min: number
  readonly max: number
  /** Garments that it is offered for. */
  readonly garments: readonly string[]
}

/** A mark that a remedy moves. */
export interface RemedyMove {
  readonly remedy: string
  readonly piece: string
  readonly mark: string
  readonly by: Point
  /** mm */
  readonly distance: number
}

export type DesignChoice = number | string | boolean

export interface DraftOrder {
  readonly garment: string
  /** mm, by measurement id; what the garment does not need is ignored. */
  readonly measurements: Readonly<Record<string, number>>
  /** Lengths in mm, angles in degrees; defaults fill in. */
  readonly design?: Readonly<Record<string, DesignChoice>>
  /** The drafting method that the draft follows; without one the garment's own rules. */
  readonly method?: MethodUse
  /** Formulas that replace the method's and the garment's own. */
  readonly rules?: Readonly<Record<string, string>>
  /** The workroom's own measurements; their values stand among `measurements`, and formulas may name them. */
  readonly ownMeasurements?: readonly OwnMeasurement[]
  readonly corrections?: readonly Correction[]
  /** Named fit remedies, on top of rules and style and beneath the corrections. */
  readonly remedies?: readonly RemedyUse[]
  /** Wording of steps only; default 'cm'. */
  readonly unit?: Unit
  /** Round every tape mark to so many mm while drafting (chalk guide). */
  readonly tape?: number
  /** false leaves step texts and sums out (while dragging). */
  readonly explain?: boolean
}

export type Unit = 'in' | 'cm'

export interface Problem {
  readonly field: string
  readonly code: string
  readonly message: string
  readonly min?: number
  readonly max?: number
  readonly position?: number
}

export type DraftingErrorCode =
  | 'unknown-garment'
  | 'unknown-field'
  | 'missing-measurement'
  | 'out-of-range'
  | 'bad-length'
  | 'bad-formula'
  | 'impossible-shape'

export interface DesignValue {
  readonly id: string
  readonly name: string
  /** 'neckline', 'sleeve', 'skirt'… for grouping. */
  readonly part: string
  readonly kind: 'length' | 'angle' | 'share' | 'count' | 'choice' | 'yes-no'
  readonly default: DesignChoice
  readonly min?: number
  readonly max?: number
  readonly choices?: readonly string[]
  /** Offered only then. */
  readonly when?: { readonly id: string; readonly is: readonly DesignChoice[] }
}

export interface RuleDefinition {
  readonly id: string
  readonly name: string
  readonly kind: 'length' | 'angle' | 'number'
  readonly formula: string
  readonly source: string
}

/** One rule of a garment as a drafting method has it. */
export interface MethodRule {
  /** Of the garment's rule that it replaces. */
  readonly id: string
  readonly formula: string
  readonly source: string
}

/** A named set of formulas that a drafter works by: for each garment the rules that differ from the garment's own. */
export interface DraftingMethod {
  readonly id: string
  readonly name: string
  readonly description: string
  /** By garment. A garment that is not here is drafted by its own rules. */
  readonly garments: Readonly<Record<string, readonly MethodRule[]>>
}

/**
 * The method that a draft follows. Its rules for the garment stand in the order itself, so that a method changed later leaves
 * old drafts as they are; without `rules` it is a built-in one.
 */
export interface MethodUse {
  readonly id: string
  readonly name?: string
  readonly version?: number
  readonly rules?: readonly MethodRule[]
}

/** A rule as a draft works by it, and who says so: the garment, the method, or the drafter for this draft alone. */
export interface RuleInForce extends RuleDefinition {
  readonly from: 'garment' | 'method' | 'order'
}

/** A measurement that a workroom takes and the engine does not know. */
export interface OwnMeasurement {
  /** Words joined by underscores, such as across_shoulder_blades: no name of the engine's has one, now or later. */
  readonly id: string
  readonly name: string
  /** How it is taken, in one sentence. */
  readonly how: string
  /** mm, outside which it is refused. */
  readonly min: number
  readonly max: number
}

export interface GarmentDefinition {
  readonly id: string
  readonly name: string
  /** Measurement ids it cannot do without. */
  readonly needs: readonly string[]
  /** Ids it uses and can estimate by a named rule, with a caution. */
  readonly estimates: readonly string[]
  readonly design: readonly DesignValue[]
  readonly rules: readonly RuleDefinition[]
}

export interface MeasurementDefinition {
  readonly id: string
  readonly name: string
  /** How it is taken, in one sentence. */
  readonly how: string
  /** The published standard's term, where one defines it. */
  readonly standard?: string
  /** mm, outside which it is refused. */
  readonly min: number
  readonly max: number
}

/** A size of a nest: a name and its measurements, mm. */
export interface NestSize {
  readonly id: string
  readonly name: string
  readonly card: Readonly<Record<string, number>>
}

/** One size as it was drafted, and the style its lines are drawn in. */
export interface NestedSize {
  readonly id: string
  readonly name: string
  readonly style: string
  readonly draft: Draft
}

/** A piece in all its sizes, laid on each other at one mark. */
export interface NestedPiece {
  readonly id: string
  readonly name: string
  /** The mark at which the sizes lie on each other. */
  readonly alignedAt: string
  /** How each size is moved in its own frame, by size; sizes that have no such piece are left out. */
  readonly shifts: Readonly<Record<string, Point>>
  /** The size that lies still: its label, grain and inner lines are drawn. */
  readonly base: string
}

/** A fit in all sizes, mm. */
export interface NestFit {
  readonly id: string
  readonly sizes: Readonly<
    Record<string, { readonly body?: number; readonly ease: number; readonly length: number }>
  >
}

/** A garment in a range of sizes at once. */
export interface Nest {
  readonly garment: string
  /** From the first that was asked for to the last. */
  readonly sizes: readonly NestedSize[]
  readonly pieces: readonly NestedPiece[]
  readonly fits: readonly NestFit[]
}

export type DrawingItem =
  | {
      readonly kind: 'path'
      readonly path: Path
      readonly layer: string
      readonly style: string
      readonly piece?: string
      readonly id?: string
    }
  | {
      readonly kind: 'text'
      readonly text: string
      readonly at: Point
      /** Degrees clockwise. */
      readonly turn: number
      /** mm. */
      readonly size: number
      readonly layer: string
      readonly style: string
      readonly piece?: string
      readonly id?: string
    }

/** A drawing ready for any page: the one source for canvas, SVG, PDF, projector and review sheets. */
export interface Drawing {
  readonly items: readonly DrawingItem[]
  readonly bounds: { readonly min: Point; readonly max: Point }
}
