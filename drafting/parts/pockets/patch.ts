import type { DesignValue, Path, RuleDefinition } from '../../contract'
import { arcPath, endOf, intersections, joinPaths } from '../../geometry'
import { length, yesNo } from '../../pen/design'
import { lengthRule, type Garment } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { pinned } from '../fitted-waist'

const worn = { id: 'patchPockets', is: [true] }

/** Style values of patch pockets. Sizes: common practice, a hand's breadth and half again as deep. */
export const patchDesign: readonly DesignValue[] = [
  yesNo('patchPockets', 'Patch pockets', 'pockets', false),
  length('patchWidth', 'Width of the patch pocket', 'pockets', { default: 140, min: 90, max: 190 }, worn),
  length('patchDepth', 'Depth of the patch pocket', 'pockets', { default: 160, min: 100, max: 230 }, worn),
  length('patchTop', 'Patch pocket below the waist', 'pockets', { default: 100, min: 40, max: 250 }, worn),
  length('patchOut', 'Patch pocket from the centre', 'pockets', { default: 70, min: 30, max: 160 }, worn),
  length('patchHem', 'Hem of the patch pocket', 'allowances', { default: 30, min: 15, max: 50 }, worn),
  length('patchAllowance', 'Patch pocket allowance', 'allowances', { default: 12.7, min: 5, max: 20 }, worn),
]

export const patchRules: readonly RuleDefinition[] = [
  lengthRule('patchLevel', 'Patch pocket, clear of the hem', 'min(patchTop, patchLowest)'),
  lengthRule('patchPlace', 'Patch pocket, clear of the side', 'min(patchOut, patchRoom)'),
]

export const patchFound: Garment['found'] = { patchLowest: 'length', patchRoom: 'length' }

/** Common practice: so far a patch stays clear of the side and of the centre, and of the hem, mm. */
const clearOfSide = 15
const clearOfCentre = 20
const aboveHem = 40

/**
 * Draws a patch pocket and marks where it is stitched on: the level of its mouth is measured down from a mark on the centre of
 * the garment's piece. Where there is no room it is moved, or left out, and that is said.
 *
 * @param centre the mark on the centre from which its place is measured down.
 */
export function patchPocket(pen: Pen, on: PiecePen, centre: string): void {
  if (!pen.chosen('patchPockets')) return
  const [wide, deep] = [pen.length('patchWidth'), pen.length('patchDepth')]
  const from = on.at(centre)
  const side = on.edge('side')
  const hem = Math.min(endOf(side.path).y, ...on.edge('hem').path.segments.map((one) => one.to.y))
  pen.find('patchLowest', hem - aboveHem - deep - from.y, side.uses | pen.usesOf(['patchDepth']))
  const top = from.y + pen.value('patchLevel')
  const reach = [top, top + deep / 2, top + deep].map(
    (y) => intersections(side.path, straight({ x: -4000, y }, { x: 8000, y })).at(-1)?.point.x ?? 0,
  )
  const room = Math.min(...reach) - clearOfSide - wide
  pen.find('patchRoom', room, side.uses | pen.usesOf(['patchLevel', 'patchDepth', 'patchWidth']))
  if (room < clearOfCentre || pen.value('patchLevel') < clearOfCentre) {
    pen.caution(
      'patch-left-out',
      'Between centre, side and hem there is no room for a patch pocket, so none is drawn. Make it smaller.',
      'patchPockets',
      'patchWidth',
      'patchDepth',
    )
    return
  }
  if (
    pen.value('patchPlace') < pen.value('patchOut') - 0.01 ||
    pen.value('patchLevel') < pen.value('patchTop') - 0.01
  ) {
    pen.caution(
      'patch-moved',
      'The patch pocket is set nearer to the centre or higher than asked, to stay clear of side and hem.',
      'patchOut',
      'patchTop',
      'patchWidth',
      'patchDepth',
    )
  }
  mark(pen, on, centre, deep)
  drawPatch(pen, wide, deep)
}

const fixed = 'It shows where the pocket is stitched on: change the place or the size of the pocket.'

/** The place of the pocket on the garment, with drill points inside the corners of its mouth. */
function mark(pen: Pen, on: PiecePen, centre: string, deep: number): void {
  on.go('patchLevel', centre, 'down', 'patchLevel', {
    say: 'Come down to the mouth of the patch pocket',
    round: 'down',
    drag: ['patchTop'],
    fixed,
  })
  on.go('patchInner', 'patchLevel', 'right', 'patchPlace', {
    say: 'Go out to its inner edge',
    round: 'down',
    kind: 'drill',
    drag: ['patchOut'],
    fixed,
  })
  on.go('patchOuter', 'patchInner', 'right', 'patchWidth', {
    say: 'Go across its width',
    kind: 'drill',
    fixed,
  })
  const [inner, outer] = [on.at('patchInner'), on.at('patchOuter')]
  const low = inner.y + deep
  const round = joinPaths(
    straight(outer, { x: outer.x, y: low }),
    straight({ x: outer.x, y: low }, { x: inner.x, y: low }),
    straight({ x: inner.x, y: low }, inner),
  )
  const uses = on.usesOf('patchInner', 'patchOuter') | pen.usesOf(['patchDepth'])
  on.inner('patch', 'placement', round, 'Stitch the patch pocket on along three sides', uses, 'line')
  pen.tag({
    piece: on.id,
    from: 'patchLevel',
    to: 'patchInner',
    label: 'Patch pocket from the centre',
    ...(pen.value('patchPlace') === pen.value('patchOut') ? { value: 'patchOut' } : {}),
  })
}

/** The patch: a turned hem at the mouth, the other sides turned in; its lower corners are rounded. */
function drawPatch(pen: Pen, wide: number, deep: number): void {
  const patch = pen.piece('patch-pocket', 'Patch pocket', 'Change the width or the depth of the pocket.')
  const radius = Math.min(25, wide / 4)
  const uses = ['patchWidth', 'patchDepth']
  patch.start('mouthLeft', { x: 0, y: 0 }, 'Mark a corner of the mouth')
  patch.go('mouthRight', 'mouthLeft', 'right', 'patchWidth', {
    say: 'Go across the width',
    drag: ['patchWidth'],
  })
  patch.go('bottom', 'mouthLeft', 'down', 'patchDepth', { say: 'Come down the depth', drag: ['patchDepth'] })
  const low = deep - radius
  patch.place('roundRight', { x: wide, y: low }, { say: 'Begin to round the corner', uses })
  patch.place('roundLeft', { x: 0, y: low }, { say: 'The same on the other side', uses })
  const { id } = patch
  pen.tag({ piece: id, from: 'mouthLeft', to: 'mouthRight', label: 'Width', value: 'patchWidth' })
  pen.tag({ piece: id, from: 'mouthLeft', to: 'bottom', label: 'Depth', value: 'patchDepth' })
  const turnedIn = { role: 'free', finish: 'turned', allowance: 'patchAllowance' } as const
  patch.line('mouth', 'mouthLeft', 'mouthRight', {
    role: 'hem',
    allowance: 'patchHem',
    corner: 'turned',
    say: 'The mouth, turned down and stitched',
  })
  patch.line('right', 'mouthRight', 'roundRight', { ...turnedIn, corner: 'turned', say: 'A side, turned in' })
  patch.curve('round', roundedBottom(wide, deep, radius), 'roundRight', 'roundLeft', {
    ...turnedIn,
    say: 'Draw the bottom with rounded corners, turned in over a card',
    uses,
  })
  patch.line('left', 'roundLeft', 'mouthLeft', { ...turnedIn, say: 'The other side, turned in' })
  patch.grain({ x: wide / 2, y: deep * 0.2 }, { x: wide / 2, y: deep * 0.8 })
  patch.cut({ cloth: 'main', count: 2, onFold: false, handed: false })
}

function roundedBottom(wide: number, deep: number, radius: number): Path {
  const low = deep - radius
  const right = arcPath({ x: wide - radius, y: low }, radius, 0, 90)
  const left = arcPath({ x: radius, y: low }, radius, 90, 180)
  const [a, b] = [
    { x: wide - radius, y: deep },
    { x: radius, y: deep },
  ]
  return joinPaths(pinned(right, { x: wide, y: low }, a), straight(a, b), pinned(left, b, { x: 0, y: low }))
}
