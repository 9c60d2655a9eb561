import type { Draft, Path, Piece, Unit } from '../contract'
import { startOf } from '../geometry'
import { formatLength } from '../lengths'
import { runsLength, piecesById } from '../pieces/runs'
import { seamAgrees } from '../pieces/seam-agrees'
import { curvesOf } from './curves'
import { edgeName } from './edge-name'
import type { ChalkCurve } from './curves'
import { foldOf } from './folds'
import type { ChalkFold } from './folds'
import { layingsOf, letterAt } from './layings'
import type { Laying } from './layings'

/** How one piece, or two that are cut together, are chalked straight onto the folded cloth. */
export interface ChalkSheet {
  readonly id: string
  readonly name: string
  /** Ids of the pieces. */
  readonly pieces: readonly string[]
  readonly fold: ChalkFold
  readonly layings: readonly Laying[]
  readonly curves: readonly ChalkCurve[]
  /** 'Side seam: 1 in', one line for each allowance that differs. */
  readonly allowances: readonly string[]
  readonly notches: readonly string[]
  /** What is cut before what; empty where it does not matter. */
  readonly cutting: readonly string[]
}

/** A seam, so that the maker can check with the tape what she has chalked. */
export interface ChalkCheck {
  readonly name: string
  readonly words: string
  readonly agrees: boolean
}

export interface ChalkGuide {
  readonly sheets: readonly ChalkSheet[]
  /** What holds for every piece. */
  readonly rules: readonly string[]
  readonly checks: readonly ChalkCheck[]
  readonly unit: Unit
}

/**
 * The chalk guide of a draft: for cutting without paper. Draft it with the order's `tape` set, so that every distance is a mark of
 * the tape and the seams still meet, and with `explain`, as it is told from the steps.
 *
 * @param unit of the tape
 * @param tape between two of its marks, mm: what the draft's order was rounded to
 */
export function chalkGuide(draft: Draft, unit: Unit, tape: number): ChalkGuide {
  const say = (mm: number) => formatLength(mm, unit)
  const cloth = draft.pieces.filter((piece) => piece.cut.some((cutting) => cutting.cloth === 'main'))
  return {
    unit,
    sheets: inOrder(cloth).map((piece) => sheetOf(draft, piece, say)),
    rules,
    checks: checksOf(draft, say, tape),
  }
}

const rules = [
  'A nap or a one-way print runs the same way on every piece: from its top to its hem.',
  'Cut along the allowance line, not the stitching line.',
  'Snip the notches no deeper than half the allowance.',
]

/** The back first where back and front are cut from one fold: it is the shallower of the two. */
function inOrder(pieces: readonly Piece[]): readonly Piece[] {
  const [front, back] = ['front', 'back'].map((id) => pieces.find((piece) => piece.id === id))
  if (!front || !back || !isOnFold(front) || !isOnFold(back)) return pieces
  return [back, front, ...pieces.filter((piece) => piece !== front && piece !== back)]
}

/** Writes a length as it stands on the tape. */
export type Say = (mm: number) => string

function sheetOf(draft: Draft, piece: Piece, say: Say): ChalkSheet {
  return {
    id: piece.id,
    name: piece.name,
    pieces: [piece.id],
    fold: foldOf(piece, say),
    layings: layingsOf(draft, piece, say),
    curves: curvesOf(draft, piece, say),
    allowances: allowancesOf(draft, piece, say),
    notches: notchesOf(piece, say),
    cutting: cuttingOf(draft, piece),
  }
}

function allowancesOf(draft: Draft, piece: Piece, say: Say): readonly string[] {
  const byLength = new Map<number, string[]>()
  for (const edge of piece.edges) {
    if (edge.role === 'fold' || edge.role === 'dart') continue
    const key = Math.round(edge.allowance * 10) / 10
    const names = byLength.get(key) ?? []
    const name = edgeName(edge.id)
    byLength.set(key, names.includes(name) ? names : [...names, name])
  }
  return [...byLength]
    .sort(([a], [b]) => b - a)
    .map(([mm, names]) => `${mm === 0 ? 'Nothing' : say(mm)} outside ${listed(names)}`)
}

/** 'a, b and c' */
export function listed(names: readonly string[]): string {
  if (names.length < 2) return names.join('')
  return `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`
}

/** Notches of one edge that are snipped alike, in one line. */
function notchesOf(piece: Piece, say: Say): readonly string[] {
  const lines = new Map<string, string[]>()
  for (const { edge, at, ticks } of piece.notches) {
    if (at <= 1) continue
    const start = `${ticks === 2 ? 'Two snips' : 'One snip'} on ${edgeName(edge)} at`
    const from = letterAt(piece, startOf(pathOf(piece, edge))) ?? 'where it begins'
    const key = `${start}|from ${from}`
    lines.set(key, [...(lines.get(key) ?? []), say(at)])
  }
  return [...lines].map(([key, places]) => key.replace('|', ` ${listed(places)} `))
}

function pathOf(piece: Piece, edge: string): Path {
  const found = piece.edges.find(({ id }) => id === edge)
  if (!found) throw new Error(`A notch of ${piece.id} names the edge ${edge}, which was not drawn.`)
  return found.path
}

/** Where front and back are cut from one fold, what is shallower is cut first through all layers. */
function cuttingOf(draft: Draft, piece: Piece): readonly string[] {
  const twin = { front: 'back', back: 'front' }[piece.id]
  const both = twin !== undefined && draft.pieces.some((other) => other.id === twin && isOnFold(other))
  if (!both || !isOnFold(piece)) return []
  return piece.id === 'back'
    ? [
        'With front and back folded together, cut the back neck and the back armhole through all layers first.',
      ]
    : ['Lift the back away, then deepen the neck and the armhole of the front to its own lines.']
}

const isOnFold = (piece: Piece) => piece.cut.some(({ cloth, onFold }) => cloth === 'main' && onFold)

/** On a tape, half a mark between two sides is as near as chalk comes. */
function checksOf(draft: Draft, say: Say, tape: number): readonly ChalkCheck[] {
  const pieces = piecesById(draft.pieces)
  return draft.seams.map((seam) => {
    const a = runsLength(seam.a, pieces)
    const b = runsLength(seam.b, pieces)
    const how = seam.join === 'gathered' ? 'to gather in' : 'to ease in'
    const ease = Math.abs(a - b) >= tape / 2 ? `, ${say(Math.abs(a - b))} ${how}` : ''
    return { name: seam.name, words: `${say(a)} to ${say(b)}${ease}`, agrees: seamAgrees(seam, tape / 2) }
  })
}
