import { choice, length, share } from '../../pen/design'
import { geometry, lengthRule } from '../../pen/garment'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { pinned } from '../fitted-waist'
import { seamPockets } from '../pockets/in-seam'
import { patchDesign, patchFound, patchPocket, patchRules } from '../pockets/patch'
import { takeIn } from '../take-in'
import { bandAlways, waistbandRules } from '../waistband'
import { drawSkirtCentre, skirtCentreMarks } from './centre'
import { findWaist, fitHem, fitHip, hipUnknown } from './fits'
import { bandOnSkirt, halfWaist, placesAround, sewSkirtSides, wholeWaist, type DrawnHalf } from './seams'
import { backOnFold, reachesHip, skirtPiece, type Skirt, type SkirtUse } from './skirt'

/**
 * Rectangles gathered into a band. Fullness, common practice: one and a half times the waist for heavy cloth, two for most, two
 * and a half for fine.
 */
export const gathered: Skirt = {
  name: 'Gathered skirt',
  needs: ['waist'],
  estimates: ['hip', 'bust', 'height', 'waistToHip'],
  design: [
    share('fullness', 'Fullness, times the waist', 'skirt', { default: 2, min: 1.5, max: 2.5 }),
    length('length', 'Length from the waist', 'skirt', { default: 650, min: 400, max: 1200 }),
    length('waistEase', 'Waist ease', 'skirt', { default: 15, min: 0, max: 60 }),
    length('hipEase', 'Hip ease', 'skirt', { default: 100, min: 20, max: 300 }),
    choice('opening', 'Opening', 'opening', ['centre-back zip', 'side zip']),
    length('zipLength', 'Zip length', 'opening', { default: 200, min: 150, max: 250 }),
    ...bandAlways,
    ...seamPockets(true),
    ...patchDesign,
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 12.7, min: 0, max: 20 }),
    length('sideAllowance', 'Side allowance', 'allowances', { default: 15, min: 0, max: 30 }),
    length(
      'centreBackAllowance',
      'Centre back allowance',
      'allowances',
      { default: 19, min: 0, max: 30 },
      { id: 'opening', is: ['centre-back zip'] },
    ),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 50, min: 0, max: 80 }),
  ],
  rules: [
    lengthRule('waistEdge', 'Waist edge', 'waist + waistEase', geometry),
    lengthRule('gatheredQuarter', 'Quarter of the skirt', 'waistEdge * fullness / 4'),
    lengthRule('hipLine', 'Hip below the waist', 'waistToHip'),
    ...waistbandRules.map((rule) =>
      rule.id === 'waistbandLength' ? { ...rule, formula: 'waistEdge', source: geometry } : rule,
    ),
    ...patchRules,
    lengthRule('gathering', 'Gathered in', 'gatheredQuarter * 4 - waistEdge', geometry),
    lengthRule('gatheringDrawn', 'Gathered in, as corrected', 'waistDrawn - waistMet', geometry),
  ],
  found: { ...patchFound, waistDrawn: 'length', waistMet: 'length' },
  draw(pen, use) {
    const front = drawRectangle(pen, 'front', use)
    const back = drawRectangle(pen, 'back', use)
    const halves = [front, back]
    sewSkirtSides(pen, front.piece, back.piece, use)
    if (!use.peplum) patchPocket(pen, front.piece, 'centreWaist')
    findWaist(pen, halves, ['gatheredQuarter'])
    const { sewnTo } = use
    const met = sewnTo ? 2 * (sewnTo.front.length + sewnTo.back.length) : pen.value('waistEdge')
    pen.find('waistMet', met, sewnTo ? sewnTo.uses : pen.usesOf(['waistEdge']))
    bandOnSkirt(pen, front, back, use, gatheringRule(pen))
    if (!use.sewnTo) fitBand(pen)
    if (pen.has('hip') && reachesHip(pen)) fitHip(pen, halves, 'fullness', 'hipEase')
    else if (!pen.has('hip')) hipUnknown(pen)
    fitHem(pen, halves)
    const [ofFront, ofBack] = [halfWaist(front), halfWaist(back)]
    return {
      ...wholeWaist(front, back),
      places: placesAround({ length: ofFront, joints: [] }, { length: ofBack, joints: [] }),
    }
  },
}

/** What is gathered in: as the rules say, or as the corrected side seams leave it. */
export function gatheringRule(pen: Pen): string {
  return Math.abs(pen.value('gatheringDrawn') - pen.value('gathering')) > 0.01
    ? 'gatheringDrawn'
    : 'gathering'
}

function drawRectangle(pen: Pen, side: 'front' | 'back', use: SkirtUse): DrawnHalf {
  const piece = skirtPiece(pen, use, side, side === 'front' ? 'Front' : 'Back')
  const half = { piece, side }
  rectangleMarks(pen, piece)
  skirtCentreMarks(pen, half, use, 'none')
  const taken = takeIn(pen, piece, straight(piece.at('sideWaist'), piece.at('sideHem')), {
    seams: [`${use.prefix}side`],
    ends: 'move',
    origin: use.origin,
  })
  const [top, end] = [taken.top ?? 'sideWaist', taken.end ?? 'sideHem']
  piece.line('waist', 'centreWaist', top, {
    role: 'waist',
    allowance: 'waistAllowance',
    finish: use.peplum ? 'bound' : 'seam',
    say: 'The edge that is gathered',
  })
  piece.curve('side', pinned(taken.path, piece.at(top), piece.at(end)), top, end, {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Draw the side',
    kind: 'line',
  })
  piece.line('hem', end, 'centreHem', {
    role: 'hem',
    allowance: 'hemAllowance',
    corner: 'turned',
    say: 'Draw the hem',
  })
  drawSkirtCentre(pen, half, use, 'none')
  const width = piece.at(top).x
  piece.inner(
    'gather',
    'gather',
    straight({ x: 0, y: 6 }, { x: width, y: 6 }),
    'Gather between centre and side',
    piece.usesOf('sideWaist'),
    'line',
  )
  const deep = piece.at('centreHem').y
  piece.grain({ x: width * 0.2, y: deep * 0.15 }, { x: width * 0.2, y: deep * 0.85 })
  const onFold = side === 'front' || backOnFold(use)
  piece.cut({ cloth: 'main', count: onFold ? 1 : 2, onFold, handed: !onFold })
  return { piece, waists: ['waist'], joints: [] }
}

const level = 'A rectangle keeps its level edges: change the length instead.'

function rectangleMarks(pen: Pen, piece: PiecePen): void {
  piece.start('centreWaist', { x: 0, y: 0 }, 'Mark the waist on the centre', { fixed: level })
  if (reachesHip(pen)) {
    piece.go('hipLevel', 'centreWaist', 'down', 'hipLine', {
      say: 'Come down to the level of the hip',
      onCentre: true,
      shared: true,
    })
  }
  piece.go('centreHem', 'centreWaist', 'down', 'length', {
    say: 'Come down the length',
    drag: ['length'],
    fixed: level,
  })
  const say = 'Go across a quarter of the waist times its fullness'
  const fixed = 'Change the fullness, or take in the side seam.'
  const options = { say, drag: ['fullness'], fixed }
  // On a tape four rounded quarters would add up to more than the gathers that were asked for.
  if (pen.tape)
    piece.place(
      'sideWaist',
      { x: pen.value('gatheredQuarter'), y: 0 },
      { ...options, uses: ['gatheredQuarter'], stepKind: 'solve' },
    )
  else piece.go('sideWaist', 'centreWaist', 'right', 'gatheredQuarter', options)
  piece.square('sideHem', 'sideWaist', 'centreHem', { say: 'Square down to the hem', fixed })
  const { id } = piece
  pen.tag({ piece: id, from: 'centreWaist', to: 'centreHem', label: 'Length', value: 'length' })
  pen.tag({ piece: id, from: 'centreWaist', to: 'sideWaist', label: 'Width', step: `${id}.sideWaist` })
}

/** The band lies on the body; the skirt hangs from it. */
function fitBand(pen: Pen): void {
  const band = pen.pieces.find((piece) => piece.id === 'waistband')
  if (!band) return
  const long = band.lengthOf('lower')
  const asked = pen.tape ? long - pen.value('waist') : pen.value('waistEase')
  const across = [{ piece: band.id, path: band.edge('lower').path, times: 1, length: long }]
  pen.fit(fitAcross('waist', 'equal', asked, pen.value('waist'), across))
}
