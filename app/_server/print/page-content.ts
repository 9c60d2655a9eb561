import 'server-only'
import { deflateSync } from 'node:zlib'
import type { Path, Point, Segment } from '@/drafting/contract'
import { paperDyes } from '@/drafting/drawing'
import type { Dye, Style } from '@/drafting/drawing'
import type { FontWeight } from './faces'
import type { TypeSetter } from './type-setter'

/** Points of a page per millimetre. */
export const pointsPerMm = 72 / 25.4

export interface TextOptions {
  readonly size: number
  readonly weight?: FontWeight
  readonly dye?: Dye
  readonly turn?: number
  readonly align?: 'start' | 'middle' | 'end'
}

/** Hundredths of a millimetre: finer than a printer's dot, and half the bytes of a float. */
const number = (value: number): string => String(Math.round(value * 100) / 100 || 0)

const share = (value: number): string => String(Math.round(value * 10_000) / 10_000 || 0)

/** The dyes as operands, worked out once. */
const colours = Object.fromEntries(
  Object.entries(paperDyes).map(([dye, hex]) => [
    dye,
    [1, 3, 5].map((at) => share(parseInt(hex.slice(at, at + 2), 16) / 255)).join(' '),
  ]),
) as Readonly<Record<Dye, string>>
const black = '0 0 0'

/** How all lines are drawn: in their colours or all black, and how many times their weight. */
export interface Pen {
  readonly black: boolean
  readonly weight: number
}

/** Colours as they are, weights as they are. */
export const plainPen: Pen = { black: false, weight: 1 }

/**
 * The content stream of one page, written in millimetres from the top left corner of the paper with y going down, as drawings
 * are. Only what changes between one item and the next is written.
 */
export class PageContent {
  readonly #operators: string[] = []
  #stroke = ''
  #fill = ''

  /** @param height of the paper, mm; null for a stamp, which is drawn about its own origin and placed by pages. */
  constructor(
    height: number | null,
    private readonly type: TypeSetter,
    private readonly pen: Pen = plainPen,
  ) {
    if (height === null) return
    this.#operators.push(`${pointsPerMm} 0 0 ${-pointsPerMm} 0 ${height * pointsPerMm} cm 1 j`)
  }

  /** Draws what `draw` draws within a window only, moved so that `from` comes to lie at the window's corner. */
  within(
    window: { x: number; y: number; width: number; height: number },
    from: Point,
    draw: () => void,
  ): void {
    const { x, y, width, height } = window
    this.#operators.push(`q ${[x, y, width, height].map(number).join(' ')} re W n`)
    this.#operators.push(`1 0 0 1 ${number(x - from.x)} ${number(y - from.y)} cm`)
    this.#forget()
    draw()
    this.#operators.push('Q')
    this.#forget()
  }

  /** Draws what `draw` draws on a layer that a reader of the document can switch off; see pdf-layers.ts. */
  on(layer: string, draw: () => void): void {
    this.#operators.push(`/OC /${layer} BDC`)
    draw()
    this.#operators.push('EMC')
  }

  /** Puts what is drawn once for all pages (see stamps.ts) with its origin at a place. */
  stamp(name: string, at: Point): void {
    this.#operators.push(`q 1 0 0 1 ${number(at.x)} ${number(at.y)} cm /${name} Do Q`)
  }

  #forget(): void {
    this.#stroke = ''
    this.#fill = ''
  }

  /** A line or a filled shape in a style of the drawing. `phase` is how far into its dashes it begins, mm. */
  path(path: Path, style: Style, phase = 0): void {
    if (path.segments.length === 0) return
    if (style.stroke) this.#useStroke(style, phase)
    else this.#useFill(style.fill ?? 'ink')
    this.#operators.push(trace(path.segments) + (style.stroke ? (path.closed ? 's' : 'S') : 'f'))
  }

  /** A straight line. */
  line(from: Point, to: Point, style: Style): void {
    this.#useStroke(style, 0)
    this.#operators.push(`${number(from.x)} ${number(from.y)} m ${number(to.x)} ${number(to.y)} l S`)
  }

  /** Upright boxes of one size, drawn or filled. */
  boxes(corners: readonly Point[], width: number, height: number, style: Style): void {
    if (corners.length === 0) return
    if (style.stroke) this.#useStroke(style, 0)
    else this.#useFill(style.fill ?? 'ink')
    const size = `${number(width)} ${number(height)} re`
    const traced = corners.map(({ x, y }) => `${number(x)} ${number(y)} ${size}`)
    this.#operators.push(`${traced.join(' ')} ${style.stroke ? 'S' : 'f'}`)
  }

  /** A circle as four cubics, off by less than 0.03 % of its radius. */
  circle(at: Point, radius: number, style: Style): void {
    const k = radius * 0.5523
    const curve = (...values: number[]) => `${values.map(number).join(' ')} c`
    this.#useStroke(style, 0)
    this.#operators.push(
      [
        `${number(at.x + radius)} ${number(at.y)} m`,
        curve(at.x + radius, at.y + k, at.x + k, at.y + radius, at.x, at.y + radius),
        curve(at.x - k, at.y + radius, at.x - radius, at.y + k, at.x - radius, at.y),
        curve(at.x - radius, at.y - k, at.x - k, at.y - radius, at.x, at.y - radius),
        curve(at.x + k, at.y - radius, at.x + radius, at.y - k, at.x + radius, at.y),
        's',
      ].join(' '),
    )
  }

  /** A text with its baseline at `at`. */
  text(text: string, at: Point, options: TextOptions): void {
    const { size, weight = 400, turn = 0, align = 'start' } = options
    const set = this.type.set(text, weight)
    const back = align === 'start' ? 0 : set.width * size * (align === 'middle' ? 0.5 : 1)
    const cos = Math.cos((turn * Math.PI) / 180)
    const sin = Math.sin((turn * Math.PI) / 180)
    this.#useFill(options.dye ?? 'ink')
    const matrix = [cos * size, sin * size, sin * size, -cos * size].map(share).join(' ')
    const shown = set.runs
      .map((run) => ('gap' in run ? `[${number(-1000 * run.gap)}] TJ` : `/${run.font} 1 Tf ${run.glyphs} Tj`))
      .join(' ')
    this.#operators.push(
      `BT ${matrix} ${number(at.x - back * cos)} ${number(at.y - back * sin)} Tm ${shown} ET`,
    )
  }

  /** Lines of text one under the other; returns the baseline after the last. */
  lines(lines: readonly string[], at: Point, leading: number, options: TextOptions): number {
    lines.forEach((line, index) => this.text(line, { x: at.x, y: at.y + index * leading }, options))
    return at.y + lines.length * leading
  }

  #useStroke(style: Style, phase: number): void {
    const dash = style.dash ?? []
    const cap = dash.length > 0 ? 0 : 1
    const width = (style.width ?? 0.3) * this.pen.weight
    const stroke = `${this.#colour(style.stroke ?? 'ink')} RG ${number(width)} w ${cap} J [${dash.map(number).join(' ')}] ${number(phase)} d`
    if (stroke === this.#stroke) return
    this.#stroke = stroke
    this.#operators.push(stroke)
  }

  #useFill(dye: Dye): void {
    const fill = `${this.#colour(dye)} rg`
    if (fill === this.#fill) return
    this.#fill = fill
    this.#operators.push(fill)
  }

  #colour(dye: Dye): string {
    return this.pen.black ? black : colours[dye]
  }

  /** The stream, deflated. */
  bytes(): Uint8Array {
    return deflateSync(this.#operators.join('\n'), { level: 6 })
  }
}

function trace(segments: readonly Segment[]): string {
  let traced = ''
  let end: Point | null = null
  for (const segment of segments) {
    if (end !== segment.from && (end?.x !== segment.from.x || end.y !== segment.from.y)) {
      traced += `${number(segment.from.x)} ${number(segment.from.y)} m `
    }
    traced +=
      segment.kind === 'line'
        ? `${number(segment.to.x)} ${number(segment.to.y)} l `
        : `${number(segment.control1.x)} ${number(segment.control1.y)} ${number(segment.control2.x)} ${number(segment.control2.y)} ${number(segment.to.x)} ${number(segment.to.y)} c `
    end = segment.to
  }
  return traced
}
