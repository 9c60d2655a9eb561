import type { Path, Run } from '../../contract'
import { pathLength } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { pocketBag, pocketMouth, sewWithPocket, type PocketMouth } from '../pockets/in-seam'
import { waistband } from '../waistband'
import type { DrawnSkirt, SkirtUse } from './skirt'

/**
 * One drawn panel for every mirrored pair, and one that is its own mirror image when their number is odd.
 *
 * @param name what a panel is called: 'Panel', 'Gore'.
 * @returns id and name of each.
 */
export function panelNames(panels: number, name = 'Panel'): readonly (readonly [string, string])[] {
  const drawn = Math.ceil(panels / 2)
  const id = name.toLowerCase()
  if (drawn === 1) return [[id, name]]
  return Array.from({ length: drawn }, (_, index) => [`${id}-${index + 1}`, `${name} ${index + 1}`] as const)
}

/** Whether the first drawn panel is the odd one out, cut once and symmetrical. */
const hasSingle = (panels: number): boolean => panels % 2 === 1

const left = (panel: PiecePen): Run => ({ piece: panel.id, edge: 'left' })
const right = (panel: PiecePen): Run => ({ piece: panel.id, edge: 'right' })
const mirrored = (run: Run): Run => ({ ...run, mirrored: true })
const reversed = (run: Run): Run => ({ ...run, reversed: true })

/** Ids of the seams in which an edge of a drawn panel is sewn: what corrections of that seam move. */
export function seamsOfEdge(panels: number, index: number, edge: 'left' | 'right'): readonly string[] {
  if (panels === 1) return ['seam']
  const last = Math.ceil(panels / 2) - 1
  // The single panel stands in the middle: its two seams are one and the same on both sides of the body.
  if (hasSingle(panels) && (index === 0 || (index === 1 && edge === 'left'))) return ['first-left', 'seam-1']
  if (edge === 'right') return index === last ? ['last'] : [`seam-${index + 1}`]
  if (index > 0) return [`seam-${index}`]
  return panels === 2 ? ['first', 'side'] : ['first']
}

/** Sews panels to their neighbours all round, with a pocket in the first seam between two and the opening in the last. */
export function sewPanels(pen: Pen, pieces: readonly PiecePen[], panels: number, use: SkirtUse): void {
  const single = hasSingle(panels)
  pieces.forEach((panel, index) => {
    const once = single && index === 0
    panel.cut({ cloth: 'main', count: once ? 1 : 2, onFold: false, handed: !once })
  })
  const first = pieces[0] as PiecePen
  const mouth = choosePocket(pen, first)
  pen.settle()
  const lengthOf = ({ piece, edge }: Run): number =>
    pieces.find((panel) => panel.id === piece)?.lengthOf(edge) ?? 0
  const sew = (id: string, name: string, a: Run, b: Run, pocket?: PocketMouth): void => {
    const seam = { id: `${use.prefix}${id}`, name, smooth: true }
    if (pocket) sewWithPocket(pen, seam, a, b, pocket, lengthOf(a))
    else pen.sew({ ...seam, a: [a], b: [b] })
  }
  if (panels === 1) sew('seam', 'Seam', right(first), reversed(left(first)))
  else if (single) {
    // The single panel joins both halves of the next pair.
    sew('first-left', `${first.name}, left`, left(first), mirrored(left(pieces[1] as PiecePen)))
  } else if (mouth && panels === 2) {
    sew('side', 'Side seam', reversed(left(first)), mirrored(reversed(left(first))), mouth)
  } else sew('first', 'First seam', left(first), mirrored(left(first)))
  for (let index = 1; index < pieces.length; index += 1) {
    const [one, next] = [pieces[index - 1] as PiecePen, pieces[index] as PiecePen]
    const name = `${one.name} to ${next.name.toLowerCase()}`
    sew(`seam-${index}`, name, right(one), reversed(left(next)), index === 1 ? mouth : undefined)
  }
  const last = pieces[pieces.length - 1] as PiecePen
  const opens = use.opening === 'zip' || use.opening === 'centre-back zip'
  if (panels > 1)
    sew('last', opens ? 'Last seam, with the opening' : 'Last seam', right(last), mirrored(right(last)))
  openPanels(pen, pieces, panels, use)
}

/** Which panel's right edge lies nearest to the side of the body: a quarter of the way round from the centre front. */
const sideSeam = (panels: number): number =>
  Math.max(0, Math.round(panels / 4 + (hasSingle(panels) ? 0.5 : 0)) - 1)

/** The zip: in the last seam, which lies at the centre back, or in the seam nearest to the side. */
function openPanels(pen: Pen, pieces: readonly PiecePen[], panels: number, use: SkirtUse): void {
  const last = pieces.length - 1
  if (use.opening === 'zip' || use.opening === 'centre-back zip' || use.opening === 'side zip') {
    const panel = pieces[use.opening === 'side zip' ? sideSeam(panels) : last] as PiecePen
    const zip = pen.length(use.zip)
    panel.notch('zip-end', 'right', Math.min(zip, panel.lengthOf('right')), 2)
    if (!use.sewnTo) pen.notion({ kind: 'zip', length: zip, count: 1 })
  } else if (pen.has('hip') && pen.value('waistEdge') < pen.value('hip')) {
    pen.caution(
      'no-opening',
      'Without an opening the waist does not go over the hip. Choose a zip, or make the waist of stretch cloth.',
      'opening',
      'hip',
    )
  }
}

/** Where a pocket goes: into the seam between the first two panels, or the first seam of two. With an odd number one side has it. */
function choosePocket(pen: Pen, first: PiecePen): ReturnType<typeof pocketMouth> {
  if (!pen.chosen('pockets')) return undefined
  const side = first.edge('right').path
  const mouth = pocketMouth(pen, alongFromTop(side), 0)
  if (mouth)
    pocketBag(pen, pathLength(side) - mouth.from - 40, first.edge('right').uses | pen.usesOf(['pocketTop']))
  return mouth
}

/** The side seam laid straight down, so that the pocket's place is measured along it. */
export function alongFromTop(side: Path): Path {
  return {
    closed: false,
    segments: [{ kind: 'line', from: { x: 0, y: 0 }, to: { x: 0, y: pathLength(side) } }],
  }
}

/** What the panels measure along one of their edges, all copies counted. */
export function overPanels(pieces: readonly PiecePen[], panels: number, edge: string) {
  return pieces.map((panel, index) => ({
    piece: panel.id,
    path: panel.edge(edge).path,
    times: timesCut(panels, index),
    length: panel.lengthOf(edge),
  }))
}

/** How often a drawn panel is cut. */
export const timesCut = (panels: number, index: number): number => (hasSingle(panels) && index === 0 ? 1 : 2)

/** The whole waist from the centre back once round; the centre front is where the first panel or its seam stands. */
export function waistOfPanels(pieces: readonly PiecePen[], panels: number): DrawnSkirt {
  const single = hasSingle(panels)
  const run = (panel: PiecePen): Run => ({ piece: panel.id, edge: 'waist' })
  const pairs = single ? pieces.slice(1) : pieces
  const middle = single ? [run(pieces[0] as PiecePen)] : []
  const half =
    pairs.reduce((sum, panel) => sum + panel.lengthOf('waist'), 0) +
    (single ? (pieces[0] as PiecePen).lengthOf('waist') / 2 : 0)
  return {
    waist: [
      ...pairs.map(run).map(reversed).reverse(),
      ...middle.map(reversed),
      ...pairs.map(run).map(mirrored),
    ],
    places: [{ key: 'centre-front', at: half }],
  }
}

/** The band that all panels are sewn into. */
export function bandOnPanels(pen: Pen, pieces: readonly PiecePen[], panels: number, use: SkirtUse): void {
  if (use.sewnTo || !pen.chosen('waistband')) return
  const runs = pieces.flatMap((panel, index): Run[] => {
    const run = { piece: panel.id, edge: 'waist' }
    return timesCut(panels, index) === 1 ? [run] : [run, mirrored(run)]
  })
  waistband(pen, runs)
}
