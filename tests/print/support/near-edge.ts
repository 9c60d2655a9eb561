import type { PagePicture } from './rendered'

/** Dots that are inked nearer to the edge of the paper than so many mm. */
export function inkedNearEdge({ width, height, dark, perMm }: PagePicture, mm: number): number {
  const edge = Math.floor(mm * perMm)
  let inked = 0
  const look = (fromX: number, toX: number, fromY: number, toY: number) => {
    for (let y = fromY; y < toY; y += 1) {
      for (let x = fromX; x < toX; x += 1) if ((dark[y * width + x] ?? 0) > 12) inked += 1
    }
  }
  look(0, width, 0, edge)
  look(0, width, height - edge, height)
  look(0, edge, edge, height - edge)
  look(width - edge, width, edge, height - edge)
  return inked
}
