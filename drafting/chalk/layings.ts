import type { Draft, Mark, Piece, Point, Step } from '../contract'
import { distance, dot, subtract, unit } from '../geometry/point'
import type { Say } from './guide'

/** A mark to be chalked, and how far along the tape it lies. */
export interface ChalkMark {
  readonly letter: string
  readonly at: Point
  /** mm along the tape, from where the tape was laid; absent where no tape is laid. */
  readonly mm?: number
  /** '7 1/2 in', or '5 in down, 2 in to the right'. */
  readonly distance?: string
  readonly words: string
}

/** One laying of the tape: from a mark in one direction, with all the marks that are read off it without moving it. */
export interface Laying {
  /** 'From A straight down' */
  readonly words: string
  /** Where the tape lies; absent for marks that are squared to, traced or begun with. */
  readonly tape?: { readonly from: Point; readonly direction: Point }
  /** Along the tape. */
  readonly marks: readonly ChalkMark[]
}

/** mm: two marks that are nearer are one. */
const near = 0.05

/** The letter of the mark that stands at a point. */
export function letterAt(piece: Piece, at: Point): string | undefined {
  return piece.marks.find((mark) => mark.letter && distance(mark.at, at) < near)?.letter
}

/** The layings of the tape for a piece, in the order of its steps. A mark that falls on one that stands already is left out. */
export function layingsOf(draft: Draft, piece: Piece, say: Say): readonly Laying[] {
  const marks = new Map(piece.marks.map((mark) => [mark.id, mark]))
  const chalked: Mark[] = []
  const layings: Laying[] = []
  for (const step of draft.steps) {
    if (step.piece !== piece.id) continue
    for (const id of step.marks) {
      const mark = marks.get(id)
      if (!mark || mark.kind !== 'construction') continue
      if (chalked.some((other) => distance(other.at, mark.at) < near)) continue
      const from = step.from === undefined ? undefined : marks.get(step.from)
      if (from && step.direction && distance(from.at, mark.at) > near)
        readOff(layings, { step, mark, from, direction: unit(step.direction), say })
      else layings.push(placed(step, mark, from, chalked[0], say))
      chalked.push(mark)
    }
  }
  return layings
}

interface Reading {
  readonly step: Step
  readonly mark: Mark
  readonly from: Mark
  readonly direction: Point
  readonly say: Say
}

/** Reads a mark off a tape that lies there already, else lays one. */
function readOff(layings: Laying[], { step, mark, from, direction, say }: Reading): void {
  const open = layings.findIndex(({ tape }) => tape !== undefined && lies(tape, direction, from.at))
  const tape = layings[open]?.tape ?? { from: from.at, direction }
  const mm = distance(tape.from, mark.at)
  const slant = wayOf(direction) === null ? ` (${aside(subtract(mark.at, tape.from), say)})` : ''
  const read = { letter: mark.letter ?? '', at: mark.at, mm, distance: say(mm) + slant, words: step.text }
  const laid = layings[open]
  if (laid) {
    const along = [...laid.marks, read].sort((a, b) => (a.mm ?? 0) - (b.mm ?? 0))
    layings[open] = { ...laid, marks: along }
  } else {
    const words = `From ${from.letter ?? 'the last mark'} ${wayOf(direction) ?? 'on the slant'}`
    layings.push({ words, tape, marks: [read] })
  }
}

/** Whether a point lies on a tape that runs in a direction. */
function lies(tape: NonNullable<Laying['tape']>, direction: Point, at: Point): boolean {
  const off = subtract(at, tape.from)
  const across = off.x * direction.y - off.y * direction.x
  return dot(tape.direction, direction) > 1 - 1e-9 && dot(off, direction) > -near && Math.abs(across) < near
}

/** A mark that no tape is laid for: squared to, traced, or standing where the work begins. */
function placed(step: Step, mark: Mark, from: Mark | undefined, first: Mark | undefined, say: Say): Laying {
  const origin = from ?? first
  const traced = step.kind === 'copy'
  const where = origin && !traced ? aside(subtract(mark.at, origin.at), say) : ''
  return {
    words: origin?.letter && where ? `From ${origin.letter}` : traced ? 'Trace' : 'Begin',
    marks: [
      { letter: mark.letter ?? '', at: mark.at, words: step.text, ...(where ? { distance: where } : {}) },
    ],
  }
}

/** '5 in down, 2 in to the right' */
function aside({ x, y }: Point, say: Say): string {
  const down = Math.abs(y) < near ? '' : `${say(Math.abs(y))} ${y > 0 ? 'down' : 'up'}`
  const over = Math.abs(x) < near ? '' : `${say(Math.abs(x))} to the ${x > 0 ? 'right' : 'left'}`
  return [down, over].filter(Boolean).join(', ')
}

const level = 1e-9

/** A direction as it is said at the table, the top of the piece lying away from the cutter; null on the slant. */
function wayOf({ x, y }: Point): string | null {
  if (Math.abs(x) < level) return y > 0 ? 'straight down' : 'straight up'
  if (Math.abs(y) < level) return x > 0 ? 'straight to the right' : 'straight to the left'
  return null
}
