import type { Drawing, DrawingItem, Unit } from '../contract'
import { layers } from './layers'
import { styleOf } from './styles'
import type { Dye, Style } from './styles'
import { svgNumber, svgPath } from './svg-path'
import { typesetFractions } from './typeset'

export interface SvgOptions {
  readonly title: string
  /** One sentence more for those who cannot see it. */
  readonly description?: string
  /** 'paper' draws to scale: 1 mm is 1 mm. 'screen' fills its box and keeps lines the same weight at any zoom. Default 'paper'. */
  readonly for?: 'paper' | 'screen'
  /** Room around the drawing, mm. Default 10. */
  readonly margin?: number
  /** Drawings of the lengths in one unit each, of which the page shows one: groups marked `data-unit`. */
  readonly units?: Readonly<Partial<Record<Unit, Drawing>>>
  /** What a dye is on this page. Default: the light theme's ink on paper. */
  readonly dye?: (dye: Dye) => string
}

/** The dyes on paper. */
export const paperDyes: Readonly<Record<Dye, string>> = {
  ink: '#1B2140',
  indigo: '#2C3A78',
  madder: '#9E2B25',
  weld: '#755200',
  fern: '#2A6541',
  walnut: '#5F5446',
}

/** px on a screen for each mm of dash on paper. */
const screenDash = 1.6

/**
 * The drawing as SVG text with one named group a layer and, within it, one a piece. Everything that came from a person is
 * escaped. Same drawing, same bytes.
 */
export function toSvg(drawing: Drawing, options: SvgOptions): string {
  const margin = options.margin ?? 10
  const { min, max } = drawing.bounds
  const width = max.x - min.x + 2 * margin
  const height = max.y - min.y + 2 * margin
  const size =
    options.for === 'screen' ? '' : ` width="${svgNumber(width)}mm" height="${svgNumber(height)}mm"`
  const box = [min.x - margin, min.y - margin, width, height].map(svgNumber).join(' ')
  const description = options.description ? `<desc>${escaped(options.description)}</desc>` : ''
  return (
    `<svg xmlns="http://www.w3.org/2000/svg"${size} viewBox="${box}" role="img" fill="none" ` +
    `stroke-linecap="round" stroke-linejoin="round" font-family="'Source Sans 3', sans-serif" text-anchor="middle">` +
    `<title>${escaped(options.title)}</title>${description}` +
    layerGroups(drawing, options) +
    Object.entries(options.units ?? {})
      .map(([unit, lengths]) => `<g data-unit="${unit}">${layerGroups(lengths, options)}</g>`)
      .join('') +
    '</svg>'
  )
}

function layerGroups(drawing: Drawing, options: SvgOptions): string {
  return layers.map((layer) => layerGroup(drawing, layer, options)).join('')
}

function layerGroup(drawing: Drawing, layer: string, options: SvgOptions): string {
  const items = drawing.items.filter((item) => item.layer === layer)
  if (items.length === 0) return ''
  const pieces = [...new Set(items.map((item) => item.piece ?? ''))]
  const groups = pieces.map((piece) => {
    const own = items.filter((item) => (item.piece ?? '') === piece)
    return `<g data-piece="${escaped(piece)}">${own.map((item) => element(item, options)).join('')}</g>`
  })
  return `<g data-layer="${layer}">${groups.join('')}</g>`
}

function element(item: DrawingItem, options: SvgOptions): string {
  const style = styleOf(item.style)
  const dye = options.dye ?? ((name: Dye) => paperDyes[name])
  const id = item.id ? ` data-id="${escaped(item.id)}"` : ''
  if (item.kind === 'path')
    return `<path${id} d="${svgPath(item.path)}"${lineAttributes(style, dye, options)}/>`
  const at = `${svgNumber(item.at.x)} ${svgNumber(item.at.y)}`
  const turn = item.turn ? ` rotate(${svgNumber(item.turn)})` : ''
  return (
    `<text${id} transform="translate(${at})${turn}" font-size="${svgNumber(item.size)}"` +
    ` font-weight="${style.weight ?? 400}" fill="${dye(style.fill ?? 'ink')}">` +
    `${escaped(typesetFractions(item.text))}</text>`
  )
}

function lineAttributes(style: Style, dye: (dye: Dye) => string, options: SvgOptions): string {
  const screen = options.for === 'screen'
  const fill = style.fill ? ` fill="${dye(style.fill)}"` : ''
  const opacity = style.opacity ? ` fill-opacity="${style.opacity}"` : ''
  if (!style.stroke) return fill + opacity
  const width = screen ? (style.screenWidth ?? 1) : (style.width ?? 0.3)
  const dash = style.dash?.map((length) => svgNumber(screen ? length * screenDash : length)).join(' ')
  return (
    `${fill}${opacity} stroke="${dye(style.stroke)}" stroke-width="${width}"` +
    (dash ? ` stroke-dasharray="${dash}" stroke-linecap="butt"` : '') +
    (screen ? ' vector-effect="non-scaling-stroke"' : '')
  )
}

/** Markup in a name is text. Characters that XML forbids are dropped. */
function escaped(text: string): string {
  return text
    .replace(/[\u0000-\u0008\u000B\u000C\u000E-\u001F\uFFFE\uFFFF]/g, '')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;')
}
