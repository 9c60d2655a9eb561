import type { PagePicture } from './rendered'

/** A drawn square as found in a picture, mm, between the middles of its lines. */
export interface FoundSquare {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

const threshold = 90

interface Run {
  readonly across: number
  readonly from: number
  readonly to: number
}

/** Straight upright or level lines of a length, each with the middle of its thickness, in dots. */
function longRuns(picture: PagePicture, level: boolean, shortest: number, longest: number): readonly Run[] {
  const lines = level ? picture.height : picture.width
  const along = level ? picture.width : picture.height
  const dark = (line: number, at: number) =>
    picture.dark[level ? line * picture.width + at : at * picture.width + line] ?? 0
  const runs: Run[] = []
  for (let line = 0; line < lines; line += 1) {
    let start = -1
    for (let at = 0; at <= along; at += 1) {
      const inked = at < along && dark(line, at) > threshold
      if (inked && start < 0) start = at
      if (!inked && start >= 0) {
        const length = (at - start) / picture.perMm
        if (length >= shortest && length <= longest) runs.push({ across: line, from: start, to: at - 1 })
        start = -1
      }
    }
  }
  return runs
    .filter(({ across }, index) => across !== (runs[index - 1]?.across ?? -9) + 1)
    .map((run) => ({
      ...run,
      across: middleOf(dark, run),
    }))
}

/** The middle of a line's thickness, weighed by darkness along the middle half of its length. */
function middleOf(dark: (line: number, at: number) => number, run: Run): number {
  const quarter = Math.round((run.to - run.from) / 4)
  let weight = 0
  let sum = 0
  for (let line = run.across - 3; line <= run.across + 8; line += 1) {
    // Writing beside the line must not pull it: what is not inked nearly all along is not the line.
    const samples = Array.from({ length: 60 }, (_, index) =>
      dark(line, run.from + quarter + Math.round((index * 2 * quarter) / 60)),
    )
    const least = samples.sort((a, b) => a - b)[15] ?? 0
    weight += least
    sum += least * (line + 0.5)
  }
  return sum / weight
}

/** The squares in a picture whose sides are within 2 % of `side` mm. */
export function findSquares(picture: PagePicture, side: number): readonly FoundSquare[] {
  const level = longRuns(picture, true, side * 0.99, side * 1.01)
  const upright = longRuns(picture, false, side * 0.99, side * 1.01)
  const mm = (dots: number) => dots / picture.perMm
  const squares: FoundSquare[] = []
  for (const top of level) {
    for (const bottom of level) {
      if (bottom.across - top.across < side * 0.98 * picture.perMm || Math.abs(bottom.from - top.from) > 3)
        continue
      const left = upright.find(
        (run) => Math.abs(run.across - top.from) < 6 && Math.abs(run.from - top.across) < 6,
      )
      const right = upright.find(
        (run) => Math.abs(run.across - top.to) < 6 && Math.abs(run.from - top.across) < 6,
      )
      if (left && right) {
        squares.push({
          left: mm(left.across),
          right: mm(right.across),
          top: mm(top.across),
          bottom: mm(bottom.across),
        })
      }
    }
  }
  return squares
}
