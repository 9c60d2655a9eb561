import type { Path, Run } from '../contract'
import { pathLength } from '../geometry'
import type { Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { pocketBag, pocketMouth, sewWithPocket } from './in-seam-pocket'
import { waistband } from './waistband'

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

/** Sews panels to their neighbours all round, with a pocket in the first seam between two and the opening in the last. */
export function sewPanels(pen: Pen, pieces: readonly PiecePen[], panels: number): void {
  const single = hasSingle(panels)
  pieces.forEach((panel, index) => {
    const once = single && index === 0
    panel.cut({ cloth: 'main', count: once ? 1 : 2, onFold: false, handed: !once })
  })
  const first = pieces[0] as PiecePen
  const last = pieces[pieces.length - 1] as PiecePen
  const long = first.lengthOf('right')
  const plain = (id: string, name: string, a: Run, b: Run): void =>
    pen.sew({ id, name, a: [a], b: [b], smooth: true })
  const withPocket = choosePocket(pen, first, panels)
  pen.settle()
  if (panels === 1) plain('seam', 'Seam', right(first), reversed(left(first)))
  else {
    if (!single) {
      if (withPocket && panels === 2)
        sewWithPocket(
          pen,
          { id: 'side', name: 'Side seam', smooth: true },
          reversed(left(first)),
          mirrored(reversed(left(first))),
          withPocket,
          long,
        )
      else plain('first', 'First seam', left(first), mirrored(left(first)))
    } else {
      // The single panel joins both halves of the next pair.
      const next = pieces[1] as PiecePen
      plain('first-left', `${first.name}, left`, left(first), mirrored(left(next)))
    }
    for (let index = 1; index < pieces.length; index += 1) {
      const a = right(pieces[index - 1] as PiecePen)
      const b = reversed(left(pieces[index] as PiecePen))
      const seam = {
        id: `seam-${index}`,
        name: `${(pieces[index - 1] as PiecePen).name} to ${(pieces[index] as PiecePen).name.toLowerCase()}`,
        smooth: true,
      }
      if (withPocket && index === 1) sewWithPocket(pen, seam, a, b, withPocket, long)
      else pen.sew({ ...seam, a: [a], b: [b] })
    }
    plain('last', 'Last seam, with the opening', right(last), mirrored(right(last)))
  }
  if (pen.chosen('opening') === 'zip') {
    const zip = pen.length('zipLength')
    last.notch('zip-end', 'right', Math.min(zip, long), 2)
    pen.notion({ kind: 'zip', length: zip, count: 1 })
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
function choosePocket(pen: Pen, first: PiecePen, panels: number): ReturnType<typeof pocketMouth> {
  if (!pen.chosen('pockets')) return undefined
  if (panels === 1) {
    pen.caution(
      'pockets-left-out',
      'One panel has one seam, and the opening is in it: no pockets are drawn.',
      'pockets',
      'panels',
    )
    return undefined
  }
  const side = first.edge('right').path
  const mouth = pocketMouth(pen, alongFromTop(side), 0)
  if (mouth)
    pocketBag(pen, pathLength(side) - mouth.from - 40, first.edge('right').uses | pen.usesOf(['pocketTop']))
  return mouth
}

/** The side seam laid straight down, so that the pocket's place is measured along it. */
function alongFromTop(side: Path): Path {
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

/** The band that all panels are sewn into. */
export function bandOnPanels(pen: Pen, pieces: readonly PiecePen[], panels: number): void {
  if (!pen.chosen('waistband')) return
  const runs = pieces.flatMap((panel, index): Run[] => {
    const run = { piece: panel.id, edge: 'waist' }
    return timesCut(panels, index) === 1 ? [run] : [run, mirrored(run)]
  })
  waistband(pen, runs)
}
