/** Where a measurement is taken on our figure (a box of 200 × 520, front view, mirrored about x = 100). */
export interface FigurePlace {
  /** Height on the body, for the order along the tape: nape about 82, floor 500. */
  readonly level: number
  readonly d: string
  /** Drawn dashed: it lies behind the figure. */
  readonly behind?: boolean
  /** What part of the body it belongs to. */
  readonly part: 'whole' | 'neck' | 'shoulder' | 'bust' | 'waist' | 'hip' | 'arm' | 'leg'
}

/** A girth: the near half of an ellipse about the body, its ends turned away behind. */
function girth(x: number, y: number, half: number, drop = 5): string {
  return `M${x - half} ${y}A${half} ${drop} 0 0 0 ${x + half} ${y}`
}

const line = (...points: (readonly [number, number])[]) =>
  `M${points.map((point) => point.join(' ')).join('L')}`

/** Every measurement that has a place of its own on the body. */
export const figurePlaces: Readonly<Record<string, FigurePlace>> = {
  height: { level: 10, part: 'whole', d: line([4, 11], [16, 11], [10, 11], [10, 500], [4, 500], [16, 500]) },
  head: { level: 30, part: 'neck', d: girth(100, 34, 22.5) },
  neckBase: { level: 80, part: 'neck', d: 'M87 82C90 92 110 92 113 82' },
  shoulderLength: { level: 84, part: 'shoulder', d: line([113, 83], [143, 97]) },
  acrossShoulders: { level: 92, part: 'shoulder', behind: true, d: 'M57 97C75 86 125 86 143 97' },
  acrossBack: { level: 112, part: 'shoulder', behind: true, d: line([67, 116], [133, 116]) },
  acrossFront: { level: 114, part: 'shoulder', d: line([69, 118], [131, 118]) },
  scyeDepth: { level: 118, part: 'shoulder', behind: true, d: line([100, 81], [100, 133]) },
  armscye: { level: 119, part: 'arm', d: 'M143 97C131 104 128 126 134 134C143 138 150 118 143 97' },
  upperBust: { level: 132, part: 'bust', d: girth(100, 132, 34) },
  bustHeight: { level: 136, part: 'bust', d: line([113, 83], [118, 150]) },
  upperArm: { level: 144, part: 'arm', d: girth(146.5, 148, 9, 3) },
  bust: { level: 150, part: 'bust', d: girth(100, 150, 37, 6) },
  bustSpan: { level: 152, part: 'bust', d: line([82, 151], [118, 151]) },
  underBust: { level: 168, part: 'bust', d: girth(100, 168, 31.5) },
  shoulderToElbow: { level: 186, part: 'arm', d: 'M144 98C152 122 156 158 158 192' },
  frontWaistLength: {
    level: 190,
    part: 'bust',
    d: 'M113 83C117 110 119 135 118 150C117 170 114 186 113 201',
  },
  elbow: { level: 192, part: 'arm', d: girth(156, 192, 7, 2.5) },
  centreFrontToWaist: { level: 194, part: 'bust', d: line([100, 90], [100, 203]) },
  napeToWaist: { level: 196, part: 'waist', behind: true, d: line([100, 80], [100, 200]) },
  waist: { level: 200, part: 'waist', d: girth(100, 200, 26) },
  waistToHip: { level: 226, part: 'hip', d: 'M126.5 200C131 216 138 232 140 250' },
  highHip: { level: 224, part: 'hip', d: girth(100, 224, 34) },
  hip: { level: 250, part: 'hip', d: girth(100, 250, 40, 6) },
  armLength: { level: 258, part: 'arm', d: 'M144 98C154 124 158 164 160 192C163 216 167 240 169 262' },
  wrist: { level: 262, part: 'arm', d: girth(167.5, 262, 4.5, 2) },
  hand: { level: 282, part: 'arm', d: girth(170, 280, 7, 2.5) },
  waistToKnee: { level: 382, part: 'leg', d: 'M128 200C137 220 143 236 143 252C142 300 134 340 130 382' },
  waistToFloor: { level: 490, part: 'leg', d: 'M130 200C140 222 147 238 147 254C146 340 132 430 128 500' },
  napeToFloor: { level: 498, part: 'whole', behind: true, d: line([100, 80], [100, 500]) },
}

/** Ids in the order of the body, from nape to floor; what has no place on the figure comes last. */
export function bodyOrder(ids: readonly string[]): readonly string[] {
  const level = (id: string) => figurePlaces[id]?.level ?? 1000
  return [...ids].sort((a, b) => level(a) - level(b))
}
