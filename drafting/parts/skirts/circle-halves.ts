import { arcPath, pathLength } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight } from '../../pen/piece-pen'
import { pinned } from '../fitted-waist'
import { takeIn } from '../take-in'
import { drawSkirtCentre, skirtCentreMarks } from './centre'
import { atWaist, byCompass, fitArcs, levelOf, onCircle } from './circle-levels'
import { alongFromTop } from './panels'
import { sewSkirtSides, wholeWaist, type DrawnHalf } from './seams'
import { backOnFold, skirtPiece, waistFinish, type DrawnSkirt, type SewnTo, type SkirtUse } from './skirt'

/**
 * A circle in two halves, front on the fold and back on the fold or with a seam, each as wide at the waist as the half of the
 * bodice that it is sewn to: so their side seams meet.
 */
export function drawCircleHalves(pen: Pen, use: SkirtUse & { readonly sewnTo: SewnTo }): DrawnSkirt {
  const { sewnTo } = use
  const whole = 2 * (sewnTo.front.length + sewnTo.back.length)
  const radius = whole / (2 * Math.PI * pen.value('circleShare'))
  const front = drawHalf(pen, use, 'front', radius, sewnTo)
  const back = drawHalf(pen, use, 'back', radius, sewnTo)
  const halves = [front, back]
  sewSkirtSides(pen, front.piece, back.piece, use, alongFromTop(front.piece.edge('side').path))
  const over = (edge: string) =>
    halves.map(({ piece }) => ({
      piece: piece.id,
      path: piece.edge(edge).path,
      times: 2,
      length: piece.lengthOf(edge),
    }))
  pen.fit(fitAcross('hem', 'shown', 0, undefined, over('hem')))
  const widest = Math.max(sewnTo.front.length, sewnTo.back.length) / radius
  const level = levelOf(pen, radius, 90, 90 - (widest * 180) / Math.PI)
  fitArcs(
    pen,
    halves.map(({ piece }) => ({ panel: piece, ends: [undefined, 'side'] as const, times: 2 })),
    level,
  )
  return wholeWaist(front, back)
}

function drawHalf(
  pen: Pen,
  use: SkirtUse,
  side: 'front' | 'back',
  radius: number,
  sewnTo: SewnTo,
): DrawnHalf {
  const piece = skirtPiece(pen, use, side, side === 'front' ? 'Front' : 'Back', byCompass)
  const half = { piece, side }
  const mask = sewnTo.uses
  const apex = { x: 0, y: -radius }
  const angle = (sewnTo[side].length / radius) * (180 / Math.PI)
  const outer = radius + pen.length('length')
  const found = { uses: ['circleShare'], mask, stepKind: 'solve' } as const
  piece.start('centreWaist', { x: 0, y: 0 }, 'Mark the waist on the centre')
  piece.place('apex', apex, { ...found, say: 'Go up the radius that gives the waist of the bodice' })
  piece.go('centreHem', 'centreWaist', 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  piece.place('sideWaist', onCircle(apex, radius, 90 - angle), {
    ...found,
    say: 'Swing the tape as far as half the waist of the bodice measures',
  })
  piece.place('sideHem', onCircle(apex, outer, 90 - angle), {
    ...found,
    uses: ['circleShare', 'length'],
    say: 'On the same line mark the hem',
  })
  pen.tag({ piece: piece.id, from: 'centreWaist', to: 'centreHem', label: 'Length', value: 'length' })
  skirtCentreMarks(pen, half, use, 'none')
  const arc = (reach: number, from: number, to: number, ends: readonly [string, string]) =>
    pinned(arcPath(apex, reach, from, to), piece.at(ends[0]), piece.at(ends[1]))
  piece.curve(
    'waist',
    arc(radius, 90, 90 - angle, ['centreWaist', 'sideWaist']),
    'centreWaist',
    'sideWaist',
    {
      role: 'waist',
      allowance: 'waistAllowance',
      finish: waistFinish(pen, use),
      say: 'Swing the waist',
      uses: ['circleShare'],
      mask,
    },
  )
  const taken = takeIn(pen, piece, straight(piece.at('sideWaist'), piece.at('sideHem')), {
    seams: [`${use.prefix}side`],
    ends: 'stay',
    alongSeam: true,
    origin: use.origin,
    instead: atWaist,
  })
  piece.curve(
    'side',
    pinned(taken.path, piece.at('sideWaist'), piece.at('sideHem')),
    'sideWaist',
    'sideHem',
    {
      role: 'seam',
      allowance: 'sideAllowance',
      kind: 'line',
      say: 'Join waist to hem',
    },
  )
  piece.curve('hem', arc(outer, 90 - angle, 90, ['sideHem', 'centreHem']), 'sideHem', 'centreHem', {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Swing the hem',
    uses: ['circleShare', 'length'],
    mask,
  })
  drawSkirtCentre(pen, half, use, 'none')
  const deep = pathLength(piece.edge('side').path)
  piece.grain({ x: 20, y: deep * 0.3 }, { x: 20, y: deep * 0.8 })
  const onFold = side === 'front' || backOnFold(use)
  piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  return { piece, waists: ['waist'], joints: [] }
}
