import type { Cutting, Dart, Edge, EdgeRole, InnerLine, Mark, Path, Point, Step } from '../contract'
import {
  add,
  distance,
  line,
  magnitude,
  openPath,
  pathLength,
  scale,
  startOf,
  endOf,
  subtract,
} from '../geometry'
import { drillPoint, sagittaOf } from './curve-measures'
import { letter } from './letters'
import { nothing, type Mask } from './masks'
import type { Pen } from './pen'
import type { DrawnEdge, EdgeOptions, MarkOptions, PenMark } from './piece-options'

const finishOf: Record<EdgeRole, Edge['finish']> = {
  seam: 'seam',
  fold: 'fold',
  hem: 'turned',
  neckline: 'seam',
  armhole: 'seam',
  waist: 'seam',
  opening: 'turned',
  dart: 'seam',
  free: 'free',
}

const directions = {
  right: { x: 1, y: 0 },
  left: { x: -1, y: 0 },
  down: { x: 0, y: 1 },
  up: { x: 0, y: -1 },
} as const

export type Direction = keyof typeof directions

/**
 * Draws one piece the way a drafter says it: marks placed from other marks by the *name* of a rule or style value, and edges
 * between them in clockwise order. Everything drawn is noted down as a step with what it follows from.
 */
export class PiecePen {
  readonly marks = new Map<string, PenMark>()
  readonly kinds = new Map<string, Mark['kind']>()
  readonly drags = new Map<string, readonly string[]>()
  /** Marks traced from another piece only to draw by; they are not on this one. */
  private readonly aids = new Set<string>()
  /** Marks that no correction moves, and why. */
  private readonly held = new Map<string, string>()
  readonly edges: DrawnEdge[] = []
  readonly darts: Dart[] = []
  readonly lines: InnerLine[] = []
  readonly extraNotches: { id: string; edge: string; at: number; ticks: 1 | 2 }[] = []
  cuttings: readonly Cutting[] = []
  grainLine: { from: Point; to: Point } | undefined

  constructor(
    readonly pen: Pen,
    readonly id: string,
    readonly name: string,
    /** Why no correction can move any of its marks, and what to correct instead. */
    private readonly fixed?: string,
  ) {}

  /** Where a mark stands. */
  at(id: string): Point {
    const mark = this.mark(id)
    this.pen.heed(mark.x | mark.y)
    return mark.at
  }

  /** The place that rules and style gave a mark, before any correction moved it: what others are measured from. */
  byRule(id: string): string {
    return this.marks.has(`${id}-by-rule`) ? `${id}-by-rule` : id
  }

  /** A mark with its dependencies. */
  mark(id: string): PenMark {
    const mark = this.marks.get(id)
    if (!mark) throw new Error(`${this.id} has no mark “${id}” yet.`)
    return mark
  }

  /** What the named marks follow from. */
  usesOf(...ids: readonly string[]): Mask {
    let mask = nothing
    for (const id of ids) {
      const mark = this.mark(id)
      mask |= mark.x | mark.y
    }
    return mask
  }

  /** The first mark of a piece. */
  start(id: string, at: Point, say: string, options: Pick<MarkOptions, 'onCentre' | 'fixed'> = {}): void {
    this.put(id, at, nothing, nothing, { ...options, say, from: undefined })
  }

  /** From a mark, go so far in a direction: the length is the value of the named rule or style value. */
  go(id: string, from: string, towards: Direction, by: string, options: MarkOptions): void {
    const origin = this.mark(from)
    const along = directions[towards]
    const length = options.round ? this.pen.lengthRounded(by, options.round) : this.pen.length(by)
    const uses = this.pen.values.mask(by)
    const vertical = towards === 'down' || towards === 'up'
    const also = this.pen.usesOf(options.also ?? [])
    this.put(
      id,
      add(origin.at, scale(along, length)),
      (vertical ? origin.x : origin.x | uses) | also,
      (vertical ? origin.y | uses : origin.y) | also,
      { ...options, from, direction: along, by, length },
    )
  }

  /** Where the line down from one mark meets the level of another. */
  square(id: string, below: string, level: string, options: MarkOptions): void {
    const column = this.mark(below)
    const row = this.mark(level)
    this.put(id, { x: column.at.x, y: row.at.y }, column.x, row.y, { ...options, from: below })
  }

  /** From a mark, so far in any direction that follows from other marks or names. */
  aim(
    id: string,
    from: string,
    along: Point,
    length: number,
    options: MarkOptions & { by?: string; through?: readonly string[]; uses?: readonly string[] },
  ): void {
    const origin = this.mark(from)
    const uses =
      this.pen.usesOf([...(options.uses ?? []), ...(options.by ? [options.by] : [])]) |
      this.usesOf(...(options.through ?? []))
    this.put(id, add(origin.at, scale(along, length)), origin.x | uses, origin.y | uses, {
      ...options,
      from,
      direction: along,
      length,
    })
  }

  /** A mark at a place worked out by construction from other marks and names. */
  place(
    id: string,
    at: Point,
    options: MarkOptions & {
      through?: readonly string[]
      uses?: readonly string[]
      from?: string
      mask?: Mask
    },
  ): void {
    const uses =
      this.pen.usesOf(options.uses ?? []) |
      this.usesOf(...(options.through ?? [])) |
      (options.mask ?? nothing)
    this.put(id, at, uses, uses, options)
  }

  /** The other side of an opened cut: so far from the first side, measured straight across the mouth. */
  turnOpen(
    id: string,
    from: string,
    at: Point,
    options: MarkOptions & {
      by: string
      length: number
      draws: Path
      uses: readonly string[]
      through: readonly string[]
    },
  ): void {
    const uses = this.pen.usesOf(options.uses) | this.usesOf(...options.through)
    this.put(id, at, uses, uses, { ...options, from, stepKind: 'turn' })
  }

  /** Notes a mark of another piece to draw by, without putting it on this one. */
  aid(id: string, source: PiecePen, uses: Mask = nothing): void {
    const mark = source.mark(id)
    this.aids.add(id)
    this.marks.set(id, { ...mark, x: mark.x | uses, y: mark.y | uses })
  }

  /** Traces a mark from another piece, in the same place. */
  trace(id: string, source: PiecePen, uses: Mask = nothing): void {
    const mark = source.mark(id)
    this.kinds.set(id, 'construction')
    this.marks.set(id, { ...mark, x: mark.x | uses, y: mark.y | uses })
    this.pen.note({
      id: `${this.id}.${id}`,
      piece: this.id,
      kind: 'copy',
      say: `Trace the point from the ${source.name.toLowerCase()}`,
      marks: [id],
      uses: mark.x | mark.y | uses,
      draws: [],
    })
  }

  /** Some marks follow from others, and some stand on the centre line: saying so is better than a crooked piece. */
  private refuseToMove(
    mark: string,
    correction: { readonly id: string; readonly by: Point },
    fixed: string | undefined,
    onCentre: boolean,
  ): void {
    const why =
      fixed ??
      (onCentre && Math.abs(correction.by.x) > 1e-9
        ? 'It stands on the centre line: move it up or down only.'
        : undefined)
    if (!why) return
    this.pen.refuse({
      field: `corrections.${correction.id}`,
      code: 'impossible-shape',
      message: `The point “${mark}” of the ${this.name.toLowerCase()} cannot be moved like that. ${why}`,
    })
  }

  private put(
    id: string,
    at: Point,
    x: Mask,
    y: Mask,
    options: MarkOptions & {
      readonly from?: string | undefined
      readonly direction?: Point
      readonly by?: string
      readonly length?: number
      readonly draws?: Path
    },
  ): void {
    const correction = this.pen.corrections.forMark(this.id, id, options.shared ?? false)
    const fixed = options.fixed ?? this.fixed
    if (fixed) this.held.set(id, fixed)
    if (correction) this.refuseToMove(id, correction, fixed, options.onCentre ?? false)
    const moved = keeping(options.keeps, correction ? add(at, correction.by) : at)
    const stays = !correction && distance(moved, at) < 1e-6
    const own = stays ? id : `${id}-by-rule`
    this.kinds.set(id, options.kind ?? 'construction')
    if (options.drag) this.drags.set(id, options.drag)
    this.marks.set(own, { id: own, at, x, y })
    const draws = options.draws ? [options.draws] : []
    if (options.from) draws.push(openPath([line(this.at(options.from), at)]))
    this.pen.note({
      id: `${this.id}.${own}`,
      piece: this.id,
      kind: options.stepKind ?? (options.length === undefined && !options.from ? 'level' : 'mark'),
      say: options.say,
      from: options.from,
      direction: options.direction,
      by: options.by,
      length: options.length,
      marks: [own],
      uses: x | y,
      draws,
    })
    if (stays) return
    const by = subtract(moved, at)
    const why = correction?.note ? `Correction: ${correction.note}` : 'Correction: move the mark'
    this.kinds.set(own, 'construction')
    this.marks.set(id, { id, at: moved, x, y })
    this.pen.note({
      id: `${this.id}.${id}`,
      piece: this.id,
      kind: 'mark',
      say: correction ? why : 'Move it with the corrected neighbour, so that the seam closes',
      from: own,
      direction: by,
      length: magnitude(by),
      marks: [id],
      uses: x | y,
      draws: [openPath([line(at, moved)])],
    })
  }

  /** A straight edge between two marks. */
  line(id: string, from: string, to: string, options: EdgeOptions): void {
    this.draw(id, openPath([line(this.at(from), this.at(to))]), 'line', options, this.usesOf(from, to))
  }

  /** A curved edge; its ends stand on two marks. */
  curve(id: string, path: Path, from: string, to: string, options: EdgeOptions): void {
    this.draw(id, path, 'curve', options, this.usesOf(from, to))
  }

  private draw(id: string, path: Path, kind: Step['kind'], options: EdgeOptions, ends: Mask): void {
    const step = `${this.id}.${id}`
    const uses =
      ends |
      this.pen.usesOf(options.uses ?? []) |
      (options.through ? this.usesOf(...options.through) : nothing) |
      (options.mask ?? nothing)
    const allowance = options.allowance ? this.pen.allowance(options.allowance) : 0
    this.edges.push({
      id,
      role: options.role,
      finish: options.finish ?? finishOf[options.role],
      path,
      allowance,
      startCorner: options.corner ?? 'mitre',
      madeBy: step,
      uses,
    })
    const sagitta = kind === 'curve' && this.pen.explains ? sagittaOf(path) : undefined
    this.pen.note({
      id: step,
      piece: this.id,
      kind: options.kind ?? kind,
      say: options.say,
      marks: [],
      edge: id,
      ...(sagitta === undefined ? {} : { sagitta }),
      uses,
      draws: [path],
    })
  }

  /** A dart whose two legs are edges drawn before; they are sewn to each other. */
  dart(id: string, edges: readonly [string, string], at: Point, pressTo: Dart['pressTo']): void {
    const [first, second] = edges.map((edge) => this.edge(edge).path) as [Path, Path]
    this.darts.push({
      id,
      legs: [first, second],
      point: at,
      edges,
      pressTo,
      intake: distance(startOf(first), endOf(second)),
    })
    this.place(`${id}-drill`, drillPoint(first, second, at), {
      say: 'Drill inside the point, where the hole is hidden when the dart is sewn',
      kind: 'drill',
      fixed: 'It follows the point of the dart.',
      mask: this.edge(edges[0]).uses | this.edge(edges[1]).uses,
    })
    this.pen.sew({
      id: `${this.id}-${id}`,
      name: `${this.name}, ${id.replaceAll('-', ' ')}`,
      a: [{ piece: this.id, edge: edges[0] }],
      b: [{ piece: this.id, edge: edges[1], reversed: true }],
    })
  }

  /**
   * A dart that lies inside the piece, from the two sides of its mouth to its point. Where it runs on beyond its mouth to
   * another point, a second dart shares the mouth.
   */
  innerDart(
    id: string,
    mouth: readonly [string, string],
    point: string,
    pressTo: Dart['pressTo'],
    say: string,
  ): void {
    const [from, to, at] = [this.at(mouth[0]), this.at(mouth[1]), this.at(point)]
    const legs = [openPath([line(from, at)]), openPath([line(at, to)])] as const
    this.darts.push({ id, legs, point: at, pressTo, intake: distance(from, to) })
    this.pen.note({
      id: `${this.id}.${id}`,
      piece: this.id,
      kind: 'line',
      say,
      marks: [],
      uses: this.usesOf(...mouth, point),
      draws: legs,
    })
  }

  /** A line inside the piece: a level, a turn line, a place for something. */
  inner(
    id: string,
    kind: InnerLine['kind'],
    path: Path,
    say: string,
    uses: Mask,
    stepKind: Step['kind'] = 'level',
  ): void {
    this.lines.push({ id, kind, path })
    this.pen.note({
      id: `${this.id}.${id}`,
      piece: this.id,
      kind: stepKind,
      say,
      marks: [],
      uses,
      draws: [path],
    })
  }

  /** A notch that belongs to no seam match: a zip end, a centre, a level. */
  notch(id: string, edge: string, at: number, ticks: 1 | 2 = 1): void {
    this.extraNotches.push({ id, edge, at, ticks })
  }

  /** An edge drawn before. */
  edge(id: string): DrawnEdge {
    const edge = this.edges.find((one) => one.id === id)
    if (!edge) throw new Error(`${this.id} has no edge “${id}” yet.`)
    this.pen.heed(edge.uses)
    return edge
  }

  /** Length of an edge, mm. */
  lengthOf(edge: string): number {
    return pathLength(this.edge(edge).path)
  }

  grain(from: Point, to: Point): void {
    this.grainLine = { from, to }
  }

  cut(...cuttings: readonly Cutting[]): void {
    this.cuttings = cuttings
  }

  /** The marks as they are given out, lettered in drafting order. */
  finishedMarks(): Mark[] {
    let index = 0
    const own = [...this.marks.values()].filter((mark) => !this.aids.has(mark.id))
    return own.map((mark) => ({
      id: mark.id,
      letter: letter(index++),
      at: mark.at,
      kind: this.kinds.get(mark.id) ?? 'construction',
      ...(this.held.has(mark.id) ? { fixed: this.held.get(mark.id) as string } : {}),
    }))
  }
}

/** The point at the length that a seam keeps, on the way to where its end was moved. */
function keeping(keeps: MarkOptions['keeps'], at: Point): Point {
  if (!keeps) return at
  const far = distance(keeps.from, at)
  return far < 1e-9 ? at : add(keeps.from, scale(subtract(at, keeps.from), keeps.length / far))
}

/** The straight path between two points. */
export function straight(from: Point, to: Point): Path {
  return openPath([line(from, to)])
}

/** From one point to another, as a vector. */
export function between(from: Point, to: Point): Point {
  return subtract(to, from)
}
