import type {
  Draft,
  DraftOrder,
  Edge,
  GarmentDefinition,
  Handle,
  Path,
  Point,
  Problem,
} from '@/drafting/contract'
import { DraftingError } from '@/drafting/drafting-error'
import type { Engine } from '@/components/studio/engine'

/** A garment of one rectangle, so that the studio's own behaviour can be seen without the engine's. */
export const bib: GarmentDefinition = {
  id: 'bib',
  name: 'Bib',
  needs: ['bust', 'waist'],
  estimates: [],
  design: [
    { id: 'depth', name: 'Depth', part: 'body', kind: 'length', default: 200, min: 50, max: 600 },
    { id: 'width', name: 'Width', part: 'body', kind: 'length', default: 300, min: 50, max: 600 },
    { id: 'share', name: 'Flare', part: 'body', kind: 'share', default: 0.25, min: 0, max: 1 },
  ],
  rules: [],
}

const line = (from: Point, to: Point): Path => ({ segments: [{ kind: 'line', from, to }], closed: false })

function check(order: DraftOrder): { depth: number; width: number } {
  const problems: Problem[] = []
  for (const field of bib.needs) {
    if (order.measurements[field] === undefined)
      problems.push({ field, code: 'missing-measurement', message: `The ${field} is missing.` })
  }
  const values = Object.fromEntries(
    bib.design.map((value) => {
      const own = order.design?.[value.id] ?? value.default
      if (typeof own === 'number' && (own < (value.min ?? 0) || own > (value.max ?? 1000)))
        problems.push({ field: value.id, code: 'out-of-range', message: `${value.name} is out of range.` })
      return [value.id, Number(own)]
    }),
  )
  const { depth = 0, width = 0 } = values
  if (depth > width * 1.5)
    problems.push({ field: 'depth', code: 'impossible-shape', message: 'Deeper than one and a half widths.' })
  if (problems.length > 0) throw new DraftingError(problems)
  return { depth, width }
}

function draftGarment(order: DraftOrder): Draft {
  const { depth, width } = check(order)
  const corners: readonly Point[] = [
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: depth },
    { x: 0, y: depth },
  ]
  const names = ['top', 'side', 'hem', 'fold'] as const
  const edges: readonly Edge[] = names.map((id, index) => {
    const path = line(corners[index] as Point, corners[(index + 1) % 4] as Point)
    return {
      id,
      role: 'free',
      path,
      allowance: 0,
      startCorner: 'mitre',
      cut: path,
      finish: 'free',
      madeBy: id,
    }
  })
  return {
    engineVersion: '0.0',
    garment: 'bib',
    pieces: [
      {
        id: 'front',
        name: 'Front',
        edges,
        cutLine: { segments: edges.flatMap((edge) => edge.path.segments), closed: true },
        grain: { from: { x: width / 2, y: 10 }, to: { x: width / 2, y: depth - 10 } },
        notches: [],
        marks: [{ id: 'corner', at: corners[2] as Point, kind: 'construction' }],
        darts: [],
        lines: [],
        cut: [{ cloth: 'main', count: 1, onFold: true, handed: false }],
      },
    ],
    seams: [],
    steps: [],
    dimensions: [
      dimension('depth', 'Depth', { x: 0, y: 0 }, { x: 0, y: depth }, depth, 'depth'),
      dimension('width', 'Width', { x: 0, y: depth }, { x: width, y: depth }, width, 'width'),
      dimension('round', 'Edge', { x: 0, y: 0 }, { x: width, y: 0 }, 2 * (depth + width)),
    ],
    fits: [],
    used: {},
    notions: [],
    cautions: [],
  }
}

function dimension(id: string, label: string, from: Point, to: Point, length: number, value?: string) {
  const shows = value ? ('value' as const) : ('result' as const)
  return { id, piece: 'front', from, to, label, length, shows, ...(value ? { value } : {}) }
}

function handles(order: DraftOrder): readonly Handle[] {
  const { depth, width } = check(order)
  return [
    {
      id: 'corner',
      piece: 'front',
      mark: 'corner',
      at: { x: width, y: depth },
      moves: [
        { value: 'width', along: { x: 1, y: 0 }, perMm: 1 },
        { value: 'depth', along: { x: 0, y: 1 }, perMm: 1 },
      ],
    },
  ]
}

export const bibEngine: Engine = { draftGarment, handles }

export const bibOrder: DraftOrder = { garment: 'bib', measurements: { bust: 900, waist: 700 }, design: {} }
