import type { Spot } from './find-marks'

import type { TapedPage } from './taped'

function onPage(page: TapedPage, spot: Spot): Spot {
  const cos = Math.cos(-page.laid.turn)
  const sin = Math.sin(-page.laid.turn)
  const x = spot.x - page.laid.x
  const y = spot.y - page.laid.y
  return { x: x * cos - y * sin, y: x * sin + y * cos }
}

/** How far a spot lies inside the printable area of a page, mm; the page where it is deepest lies on top there. */
function depth(page: TapedPage, spot: Spot): number {
  const { x, y } = onPage(page, spot)
  const width = page.picture.width / page.picture.perMm
  const height = page.picture.height / page.picture.perMm
  return Math.min(x - 10, y - 10, width - 10 - x, height - 10 - y)
}

function darkness(page: TapedPage, spot: Spot): number {
  const { picture } = page
  const { x, y } = onPage(page, spot)
  const px = x * picture.perMm - 0.5
  const py = y * picture.perMm - 0.5
  const left = Math.floor(px)
  const top = Math.floor(py)
  const at = (cx: number, cy: number) => picture.dark[cy * picture.width + cx] ?? 0
  const fx = px - left
  const fy = py - top
  return (
    at(left, top) * (1 - fx) * (1 - fy) +
    at(left + 1, top) * fx * (1 - fy) +
    at(left, top + 1) * (1 - fx) * fy +
    at(left + 1, top + 1) * fx * fy
  )
}

/**
 * The middle of the inked line that crosses the normal at a spot of the taped sheet.
 * @param width of the line that is looked for, mm: others nearby are left alone
 * @param reach how far from where it is expected it is looked for, mm
 * @throws Error when no such line is there
 */
export function lineAt(
  pages: readonly TapedPage[],
  spot: Spot,
  tangent: Spot,
  width: number,
  reach = 1.6,
): Spot {
  const page = pages.reduce((best, next) => (depth(next, spot) > depth(best, spot) ? next : best))
  const normal = { x: -tangent.y, y: tangent.x }
  const step = 0.02
  const runs: { weight: number; sum: number; from: number; to: number }[] = []
  let run: (typeof runs)[number] | null = null
  for (let across = -reach; across <= reach; across += step) {
    const dark = darkness(page, { x: spot.x + normal.x * across, y: spot.y + normal.y * across })
    if (dark < 60) {
      run = null
      continue
    }
    if (!run) {
      run = { weight: 0, sum: 0, from: across, to: across }
      runs.push(run)
    }
    run.weight += dark
    run.sum += dark * across
    run.to = across
  }
  const off = (each: (typeof runs)[number]) => Math.abs(each.to - each.from - width)
  const best = runs.reduce<(typeof runs)[number] | null>((a, b) => (a && off(a) <= off(b) ? a : b), null)
  if (!best || off(best) > width * 0.6)
    throw new Error(`No line of ${width} mm at ${spot.x}, ${spot.y} on ${page.name}`)
  const across = best.sum / best.weight
  return { x: spot.x + normal.x * across, y: spot.y + normal.y * across }
}

/** Where the straight lines through two pairs of spots meet. */
export function meeting(a: readonly [Spot, Spot], b: readonly [Spot, Spot]): Spot {
  const da = { x: a[1].x - a[0].x, y: a[1].y - a[0].y }
  const db = { x: b[1].x - b[0].x, y: b[1].y - b[0].y }
  const t = ((b[0].x - a[0].x) * db.y - (b[0].y - a[0].y) * db.x) / (da.x * db.y - da.y * db.x)
  return { x: a[0].x + da.x * t, y: a[0].y + da.y * t }
}
