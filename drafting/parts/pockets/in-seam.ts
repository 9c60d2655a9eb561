import type { DesignValue, Path, Run } from '../../contract'
import { endOf, intersections, pathLength } from '../../geometry'
import { length, yesNo } from '../../pen/design'
import { nothing, type Mask } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'

const worn = { id: 'pockets', is: [true] }

export const pocketDesign: readonly DesignValue[] = [
  yesNo('pockets', 'Pockets in the side seams', 'pockets', true),
  length('pocketTop', 'Pocket below the waist', 'pockets', { default: 65, min: 20, max: 150 }, worn),
  length('pocketOpening', 'Pocket opening', 'pockets', { default: 165, min: 120, max: 200 }, worn),
  length('pocketDepth', 'Depth of the bag', 'pockets', { default: 310, min: 250, max: 360 }, worn),
  length('pocketAllowance', 'Pocket bag allowance', 'allowances', { default: 12.7, min: 0, max: 30 }, worn),
]

/** The same, offered with them or without by default. */
export const seamPockets = (byDefault: boolean): readonly DesignValue[] =>
  pocketDesign.map((value) => (value.id === 'pockets' ? { ...value, default: byDefault } : value))

/** Common practice: the mouth ends at least so far above the hem, mm. */
const aboveHem = 80
const bagWidth = 180

/** Where the mouth lies along a side seam, mm from its top. */
export interface PocketMouth {
  readonly from: number
  readonly to: number
}

/**
 * Finds the mouth on a side seam: its top so far below the waist, measured down the body.
 *
 * @param waistLevel y of the waist on the piece, mm.
 * @returns undefined, with a caution, where the seam is too short for any.
 */
export function pocketMouth(pen: Pen, seam: Path, waistLevel: number): PocketMouth | undefined {
  const reach = (y: number): number =>
    intersections(seam, straight({ x: -50, y }, { x: 3000, y }))[0]?.a ?? (y > endOf(seam).y ? Infinity : 0)
  const opening = pen.length('pocketOpening')
  const wanted = pen.onTape(reach(waistLevel + pen.length('pocketTop')))
  const lowest = pathLength(seam) - aboveHem - opening
  if (wanted <= lowest) return { from: wanted, to: wanted + opening }
  const raised = pen.tape ? Math.floor(lowest / pen.tape) * pen.tape : lowest
  if (raised < reach(waistLevel)) {
    pen.caution(
      'pockets-left-out',
      `Between the waist and the hem there is no room for a pocket, so none is drawn. Make the garment longer for pockets.`,
      'pockets',
      'length',
    )
    return undefined
  }
  pen.caution(
    'pocket-raised',
    `The pocket is set ${pen.say(wanted - raised)} higher than asked, to stay clear of the hem.`,
    'pocketTop',
    'length',
  )
  return { from: raised, to: raised + opening }
}

/**
 * A pocket bag whose mouth is a copy of the side seam; two of them hang in each side seam.
 *
 * @param uses what the seam that it hangs in follows from.
 * @param least how deep the bag may hang before it shows below the hem, mm.
 */
export function pocketBag(pen: Pen, least: number, uses: Mask): PiecePen {
  const bag = pen.piece(
    'pocket-bag',
    'Pocket bag',
    'The bag follows its opening and its depth: change those instead.',
  )
  const opening = pen.length('pocketOpening')
  const wanted = pen.length('pocketDepth')
  const depth = Math.max(opening + 40, Math.min(wanted, least))
  if (depth < wanted - 0.01) {
    pen.caution(
      'pocket-bag-shortened',
      `The pocket bag is cut ${pen.say(depth)} deep so that it does not hang below the hem.`,
      'pocketDepth',
      'length',
    )
  } else if (depth > wanted + 0.01) {
    pen.caution(
      'pocket-bag-deepened',
      `The pocket bag is cut ${pen.say(depth)} deep, so that it holds more below its opening.`,
      'pocketDepth',
      'pocketOpening',
    )
  }
  const names = ['pocketOpening', 'pocketDepth']
  const mask = depth < wanted ? uses : nothing
  bag.start('mouthTop', { x: 0, y: 0 }, 'Mark the top of the mouth')
  bag.go('mouthEnd', 'mouthTop', 'down', 'pocketOpening', {
    say: 'Come down the opening; it is a copy of the side seam',
    drag: ['pocketOpening'],
  })
  pen.tag({
    piece: 'pocket-bag',
    from: 'mouthTop',
    to: 'mouthEnd',
    label: 'Pocket opening',
    value: 'pocketOpening',
  })
  const low = { x: -bagWidth * 0.5, y: depth }
  const far = { x: -bagWidth, y: depth * 0.5 }
  bag.place('bottom', low, { say: 'Mark the bottom of the bag', uses: names, mask })
  bag.place('inside', far, { say: 'Mark the inner edge of the bag', uses: names, mask })
  bag.line('mouth', 'mouthTop', 'mouthEnd', {
    role: 'seam',
    allowance: 'sideAllowance',
    kind: 'copy',
    say: 'Draw the mouth',
  })
  bag.curve(
    'outer',
    {
      closed: false,
      segments: [
        {
          kind: 'cubic',
          from: { x: 0, y: opening },
          control1: { x: -8, y: opening + (depth - opening) * 0.6 },
          control2: { x: -bagWidth * 0.22, y: depth },
          to: low,
        },
        {
          kind: 'cubic',
          from: low,
          control1: { x: -bagWidth * 0.8, y: depth },
          control2: { x: -bagWidth, y: depth * 0.78 },
          to: far,
        },
        {
          kind: 'cubic',
          from: far,
          control1: { x: -bagWidth, y: depth * 0.2 },
          control2: { x: -bagWidth * 0.5, y: 0 },
          to: { x: 0, y: 0 },
        },
      ],
    },
    'mouthEnd',
    'mouthTop',
    {
      role: 'seam',
      allowance: 'pocketAllowance',
      // It runs on from the mouth almost straight: a mitre of two different allowances would lie far off.
      corner: 'step',
      say: 'Draw round the bag in one sweep',
      uses: names,
      through: ['bottom', 'inside'],
      mask,
    },
  )
  bag.cut({ cloth: 'main', count: 4, onFold: false, handed: true })
  bag.grain({ x: -bagWidth * 0.45, y: depth * 0.3 }, { x: -bagWidth * 0.45, y: depth * 0.75 })
  return bag
}

/** One side of a seam: an edge, or what gives the stretches of one that a dart divides. */
type Side = Run | ((from: number, to: number) => readonly Run[])

/**
 * Sews a side seam with a pocket in it: the two sides to each other above and below the mouth, and to the bags along it.
 *
 * @param a, b the two sides, drawn from the same end; `mirrored` and `reversed` runs are kept as they are.
 */
export function sewWithPocket(
  pen: Pen,
  seam: { readonly id: string; readonly name: string; readonly smooth?: boolean },
  a: Side,
  b: Side,
  mouth: PocketMouth,
  length: number,
): void {
  const stretch = (side: Side, from: number, to: number): readonly Run[] =>
    typeof side === 'function' ? side(from, to) : [{ ...side, from, to }]
  const bag: Run = { piece: 'pocket-bag', edge: 'mouth' }
  pen.sew({
    ...seam,
    id: `${seam.id}-above`,
    name: `${seam.name}, above the pocket`,
    a: stretch(a, 0, mouth.from),
    b: stretch(b, 0, mouth.from),
  })
  pen.sew({
    id: `${seam.id}-pocket-front`,
    name: `${seam.name}, front to pocket bag`,
    a: stretch(a, mouth.from, mouth.to),
    b: [bag],
  })
  pen.sew({
    id: `${seam.id}-pocket-back`,
    name: `${seam.name}, back to pocket bag`,
    a: stretch(b, mouth.from, mouth.to),
    b: [{ ...bag, mirrored: true }],
  })
  pen.sew({
    ...seam,
    id: `${seam.id}-below`,
    name: `${seam.name}, below the pocket`,
    a: stretch(a, mouth.to, length),
    b: stretch(b, mouth.to, length),
  })
  pen.sew({
    id: 'pocket-bags',
    name: 'Pocket bags round the edge',
    a: [{ piece: 'pocket-bag', edge: 'outer' }],
    b: [{ piece: 'pocket-bag', edge: 'outer', mirrored: true }],
  })
}
