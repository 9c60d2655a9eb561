import type { Cutting, Draft, DrawingItem, Piece, Point } from '../contract'
import { rotate } from '../geometry/point'
import { textItem } from './items'
import { labelPlace } from './label-place'
import type { DrawingOptions, TitleBlock } from './options'
import type { StyleName } from './styles'
import { textWidth } from './text-box'

interface Line {
  readonly thing: string
  readonly text: string
  readonly style: StyleName
  /** em in mm at full size. */
  readonly size: number
}

/** Distance from one baseline to the next, in ems of the lower line. */
const leading = 1.35

/** The name of the piece, how it is cut, and which draft it belongs to, where they fit inside the piece. */
export function labelItems(piece: Piece, _draft: Draft, options: DrawingOptions): readonly DrawingItem[] {
  const scale = options.textScale ?? 1
  const lines = labelLines(piece, options).map((line) => ({ ...line, size: line.size * scale }))
  const width = Math.max(...lines.map((line) => textWidth(line.text, line.size)))
  const height = lines.reduce((sum, line) => sum + line.size * leading, 0)
  const place = labelPlace(piece, width, height)
  let down = -height / 2
  return lines.map((line) => {
    down += line.size * leading
    const offset: Point = { x: 0, y: (down - line.size * 0.3) * place.scale }
    const turned = rotate(offset, place.turn)
    const at = { x: place.at.x + turned.x, y: place.at.y + turned.y }
    return textItem(
      piece,
      'label',
      line.thing,
      line.style,
      line.text,
      at,
      line.size * place.scale,
      place.turn,
    )
  })
}

function labelLines(piece: Piece, options: DrawingOptions): readonly Line[] {
  const cut = piece.cut.map((cutting, index): Line => ({
    thing: `cut-${index}`,
    text: cuttingWords(cutting),
    style: 'label',
    size: 5.5,
  }))
  const nett: readonly Line[] =
    options.allowances === false
      ? [{ thing: 'nett', text: 'Nett: add allowances', style: 'label', size: 5.5 }]
      : []
  return [
    { thing: 'name', text: piece.name, style: 'label-name', size: 9 },
    ...cut,
    ...nett,
    ...(options.title ? [titleLine(options.title)] : []),
  ]
}

function titleLine(title: TitleBlock): Line {
  const text = [shortened(title.name), title.version, title.date].filter(Boolean).join(' · ')
  return { thing: 'draft', text, style: 'label-small', size: 4.5 }
}

/** A long name would shrink the whole label to nothing. */
function shortened(name: string): string {
  return name.length > 48 ? `${name.slice(0, 47).trimEnd()}…` : name
}

const clothNames: Readonly<Record<Cutting['cloth'], string>> = {
  main: 'main cloth',
  interfacing: 'interfacing',
  lining: 'lining',
}

/** 'Cut 2 in main cloth, a left and a right' */
export function cuttingWords(cutting: Cutting): string {
  const fold = cutting.onFold ? ' on the fold' : ''
  const pairs = cutting.count / 2
  const hands = pairs === 1 ? ', a left and a right' : `, ${pairs} lefts and ${pairs} rights`
  return `Cut ${cutting.count}${fold} in ${clothNames[cutting.cloth]}${cutting.handed ? hands : ''}`
}
