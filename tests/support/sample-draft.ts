import type { Draft, Edge, EdgeRole, Path, Piece, Point, Segment } from '@/drafting/contract'

/** A small draft whose every coordinate is known by heart, for tests of drawing and printing. Not a garment anyone would sew. */

const point = (x: number, y: number): Point => ({ x, y })

function open(...segments: Segment[]): Path {
  return { segments, closed: false }
}

function straight(...points: Point[]): Path {
  return open(
    ...points.slice(1).map((to, index): Segment => ({ kind: 'line', from: points[index] ?? to, to })),
  )
}

function edge(id: string, role: EdgeRole, path: Path, cut: Path, allowance: number): Edge {
  const finish = role === 'fold' ? 'fold' : role === 'hem' ? 'turned' : 'seam'
  return { id, role, path, allowance, startCorner: 'mitre', cut, finish, madeBy: `draw-${id}` }
}

/** 400 × 900 mm with 15 mm allowances, its left side on the fold; the top dips by a cubic that ends level. */
function panel(): Piece {
  const dip: Segment = {
    kind: 'cubic',
    from: point(0, 40),
    control1: point(150, 40),
    control2: point(250, 0),
    to: point(400, 0),
  }
  const dipCut: Segment = {
    kind: 'cubic',
    from: point(0, 25),
    control1: point(150, 25),
    control2: point(250, -15),
    to: point(415, -15),
  }
  const edges = [
    edge('waist', 'waist', open(dip), open(dipCut), 15),
    edge(
      'side',
      'seam',
      straight(point(400, 0), point(400, 900)),
      straight(point(415, -15), point(415, 930)),
      15,
    ),
    edge(
      'hem',
      'hem',
      straight(point(400, 900), point(0, 900)),
      straight(point(415, 930), point(0, 930)),
      30,
    ),
    edge('centre', 'fold', straight(point(0, 900), point(0, 40)), straight(point(0, 930), point(0, 25)), 0),
  ]
  return {
    id: 'front-panel',
    name: 'Front panel',
    edges,
    cutLine: { segments: edges.flatMap((each) => each.cut.segments), closed: true },
    grain: { from: point(200, 150), to: point(200, 750) },
    notches: [
      { id: 'hip', edge: 'side', at: 200, ticks: 1 },
      { id: 'knee', edge: 'side', at: 600, ticks: 2 },
    ],
    marks: [
      { id: 'A', letter: 'A', at: point(0, 40), kind: 'construction' },
      { id: 'pocket', at: point(300, 300), kind: 'drill' },
    ],
    darts: [],
    lines: [{ id: 'hip-level', kind: 'level', path: straight(point(0, 200), point(400, 200)) }],
    cut: [{ cloth: 'main', count: 1, onFold: true, handed: false }],
  }
}

/** 700 × 60 mm, cut twice, with 10 mm all round. */
function band(): Piece {
  const corners = [point(0, 0), point(700, 0), point(700, 60), point(0, 60), point(0, 0)]
  const outer = [point(-10, -10), point(710, -10), point(710, 70), point(-10, 70), point(-10, -10)]
  const edges = ['top', 'right', 'bottom', 'left'].map((id, index) =>
    edge(
      id,
      'seam',
      straight(corners[index] ?? point(0, 0), corners[index + 1] ?? point(0, 0)),
      straight(outer[index] ?? point(0, 0), outer[index + 1] ?? point(0, 0)),
      10,
    ),
  )
  return {
    id: 'waistband',
    name: 'Waistband',
    edges,
    cutLine: { segments: edges.flatMap((each) => each.cut.segments), closed: true },
    grain: { from: point(200, 30), to: point(500, 30) },
    notches: [{ id: 'middle', edge: 'top', at: 350, ticks: 1 }],
    marks: [],
    darts: [],
    lines: [],
    cut: [
      { cloth: 'main', count: 2, onFold: false, handed: true },
      { cloth: 'interfacing', count: 1, onFold: false, handed: false },
    ],
  }
}

/** The draft: a panel and a band, with one step, one dimension and one seam check. */
export function sampleDraft(): Draft {
  return {
    engineVersion: '0.0',
    garment: 'sample',
    pieces: [panel(), band()],
    seams: [],
    steps: [
      {
        id: 'hip',
        piece: 'front-panel',
        kind: 'level',
        text: 'Square across at the hip',
        marks: [],
        uses: [],
        draws: [straight(point(0, 200), point(420, 200))],
      },
    ],
    dimensions: [
      {
        id: 'length',
        piece: 'front-panel',
        from: point(60, 40),
        to: point(60, 900),
        label: 'Length',
        length: 860,
        shows: 'value',
        value: 'length',
      },
    ],
    fits: [],
    used: {},
    notions: [],
    cautions: [],
  }
}
