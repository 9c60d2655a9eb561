import { SVG, type Container, type Element as SvgElement, type G } from '@svgdotjs/svg.js'
import type { Drawing, DrawingItem, Path } from '@/drafting/contract'
import { layers, styleOf, svgPath, typesetFractions } from '@/drafting/drawing'
import type { View } from './view'

/** Something laid over the drawing for a while: an edge pointed out, the line of a step. */
export interface Emphasis {
  readonly id: string
  readonly piece: string
  readonly path: Path
  readonly kind: 'first-edge' | 'second-edge' | 'step-done' | 'step-now' | 'measured'
}

export interface Stage {
  /** Draws a display list: writes only what differs from what is drawn. @returns how many nodes were touched. */
  readonly show: (drawing: Drawing) => number
  /** Lays lines over the drawing, in place of those before. */
  readonly emphasise: (lines: readonly Emphasis[]) => void
  /** Moves the sheet under the window. */
  readonly look: (view: View) => void
  readonly destroy: () => void
}

/** px of dash on a screen for each mm of dash on paper. */
const screenDash = 1.6

const emphasis: Record<Emphasis['kind'], Record<string, string | number>> = {
  'first-edge': { stroke: 'var(--indigo)', 'stroke-width': 5 },
  'second-edge': { stroke: 'var(--weld)', 'stroke-width': 5, 'stroke-dasharray': '2 7' },
  'step-done': { stroke: 'var(--ink)', 'stroke-width': 1.25 },
  'step-now': { stroke: 'var(--indigo)', 'stroke-width': 4 },
  measured: { stroke: 'var(--indigo)', 'stroke-width': 3, 'stroke-dasharray': '8 4' },
}

interface Drawn {
  readonly node: SvgElement
  /** What was last written to it, to be compared. */
  readonly text: string
}

/**
 * Owns every node below an empty `<svg>`. A drawing is shown by comparing each item with what was last written under its id, so that a frame
 * of a drag touches only the lines that moved. Lines keep their weight in pixels at any zoom.
 */
export function createStage(svg: SVGSVGElement): Stage {
  const root = SVG(svg) as Container
  const sheet = root.group()
  const groups = new Map(layers.map((layer) => [layer as string, sheet.group().attr('data-layer', layer)]))
  const over = sheet.group().attr('data-layer', 'emphasis')
  let drawn = new Map<string, Drawn>()
  let laid = new Map<string, Drawn>()

  function show(drawing: Drawing): number {
    const next = new Map<string, Drawn>()
    let touched = 0
    drawing.items.forEach((item, index) => {
      const key = item.id ?? `${item.layer}:${index}`
      const text = describe(item)
      const old = drawn.get(key)
      drawn.delete(key)
      if (old?.text === text) {
        next.set(key, old)
        return
      }
      touched += 1
      const node = old?.node ?? createNode(groups.get(item.layer) ?? sheet, item)
      writeItem(node, item)
      next.set(key, { node, text })
    })
    for (const { node } of drawn.values()) node.remove()
    touched += drawn.size
    drawn = next
    return touched
  }

  function emphasise(lines: readonly Emphasis[]) {
    const next = new Map<string, Drawn>()
    for (const line of lines) {
      const key = `${line.kind}:${line.id}`
      const text = svgPath(line.path)
      const old = laid.get(key)
      laid.delete(key)
      const node = old?.node ?? emphasisNode(over, line.kind)
      if (old?.text !== text) node.node.setAttribute('d', text)
      next.set(key, { node, text })
    }
    for (const { node } of laid.values()) node.remove()
    laid = next
  }

  return {
    show,
    emphasise,
    look: ({ scale, x, y }) => {
      sheet.node.setAttribute('transform', `matrix(${scale} 0 0 ${scale} ${x} ${y})`)
    },
    destroy: () => {
      sheet.remove()
    },
  }
}

function describe(item: DrawingItem): string {
  if (item.kind === 'path') return `${item.style}|${svgPath(item.path)}`
  return `${item.style}|${item.text}|${item.at.x},${item.at.y}|${item.turn}|${item.size}`
}

function createNode(group: G, item: DrawingItem): SvgElement {
  const node = group.element(item.kind === 'path' ? 'path' : 'text')
  if (item.id) node.attr('data-id', item.id)
  if (item.piece) node.attr('data-piece', item.piece)
  return node
}

function writeItem(node: SvgElement, item: DrawingItem) {
  const style = styleOf(item.style)
  if (item.kind === 'text') {
    const { x, y } = item.at
    node.attr({
      transform: `translate(${x} ${y}) rotate(${item.turn})`,
      'font-size': item.size,
      'font-weight': style.weight ?? 400,
      'text-anchor': 'middle',
      fill: `var(--${style.fill ?? 'ink'})`,
    })
    node.node.textContent = typesetFractions(item.text)
    return
  }
  node.node.setAttribute('d', svgPath(item.path))
  if (node.attr('data-style') === item.style) return
  node.attr({ 'data-style': item.style, fill: style.fill ? `var(--${style.fill})` : 'none' })
  if (style.opacity !== undefined) node.attr('fill-opacity', style.opacity)
  if (!style.stroke) return
  node.attr({
    stroke: `var(--${style.stroke})`,
    'stroke-width': style.screenWidth ?? 1,
    'vector-effect': 'non-scaling-stroke',
    'stroke-linecap': 'round',
    'stroke-linejoin': 'round',
  })
  if (style.dash) node.attr('stroke-dasharray', style.dash.map((part) => part * screenDash).join(' '))
}

function emphasisNode(group: G, kind: Emphasis['kind']): SvgElement {
  return group.element('path').attr({
    fill: 'none',
    'vector-effect': 'non-scaling-stroke',
    'stroke-linecap': 'round',
    'stroke-linejoin': 'round',
    ...emphasis[kind],
  })
}
