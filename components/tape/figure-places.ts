/** Where a measurement is taken on our figure (a box of 200 × 520, front view, mirrored about x = 100). */
export interface FigurePlace {
  readonly d: string
  /** Drawn dashed: it lies behind the figure. */
  readonly behind?: boolean
}

/** A girth: the near half of an ellipse about the body, its ends turned away behind. */
function girth(x: number, y: number, half: number, drop = 5): string {
  return `M${x - half} ${y}A${half} ${drop} 0 0 0 ${x + half} ${y}`
}

const line = (...points: (readonly [number, number])[]) =>
  `M${points.map((point) => point.join(' ')).join('L')}`

/** Every measurement that has a place of its own on the body. */
export const figurePlaces: Readonly<Record<string, FigurePlace>> = {
  height: { d: line([4, 11], [16, 11], [10, 11], [10, 500], [4, 500], [16, 500]) },
  head: { d: girth(100, 34, 22.5) },
  neckBase: { d: 'M87 82C90 92 110 92 113 82' },
  shoulderLength: { d: line([113, 83], [143, 97]) },
  acrossShoulders: { behind: true, d: 'M57 97C75 86 125 86 143 97' },
  acrossBack: { behind: true, d: line([67, 116], [133, 116]) },
  acrossFront: { d: line([69, 118], [131, 118]) },
  scyeDepth: { behind: true, d: line([100, 81], [100, 133]) },
  armscye: { d: 'M143 97C131 104 128 126 134 134C143 138 150 118 143 97' },
  upperBust: { d: girth(100, 132, 34) },
  bustHeight: { d: line([113, 83], [118, 150]) },
  upperArm: { d: girth(146.5, 148, 9, 3) },
  bust: { d: girth(100, 150, 37, 6) },
  bustSpan: { d: line([82, 151], [118, 151]) },
  underBust: { d: girth(100, 168, 31.5) },
  shoulderToElbow: { d: 'M144 98C152 122 156 158 158 192' },
  frontWaistLength: {
    d: 'M113 83C117 110 119 135 118 150C117 170 114 186 113 201',
  },
  elbow: { d: girth(156, 192, 7, 2.5) },
  centreFrontToWaist: { d: line([100, 90], [100, 203]) },
  napeToWaist: { behind: true, d: line([100, 80], [100, 200]) },
  waist: { d: girth(100, 200, 26) },
  waistToHip: { d: 'M126.5 200C131 216 138 232 140 250' },
  highHip: { d: girth(100, 224, 34) },
  hip: { d: girth(100, 250, 40, 6) },
  armLength: { d: 'M144 98C154 124 158 164 160 192C163 216 167 240 169 262' },
  wrist: { d: girth(167.5, 262, 4.5, 2) },
  hand: { d: girth(170, 280, 7, 2.5) },
  waistToKnee: { d: 'M128 200C137 220 143 236 143 252C142 300 134 340 130 382' },
  waistToFloor: { d: 'M130 200C140 222 147 238 147 254C146 340 132 430 128 500' },
  napeToFloor: { behind: true, d: line([100, 80], [100, 500]) },
}
