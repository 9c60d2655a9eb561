import { pathLength } from '../../geometry'
import { choice, count, length } from '../../pen/design'
import { geometry, lengthRule } from '../../pen/garment'
import { fitAcross, type Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { seamPockets } from '../pockets/in-seam'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../waistband'
import { hipGirth, waistGirth } from './fits'
import { drawGore } from './gore'
import { bandOnPanels, overPanels, panelNames, sewPanels, waistOfPanels } from './panels'
import type { Skirt, SkirtUse } from './skirt'

/** Common practice: an edge shaped by more than this over the hip stands off the body, mm. */
const mostShaping = 30

/** A skirt of equal gores that flare from the hip, or above the hem like a trumpet. */
export const gored: Skirt = {
  name: 'Gored skirt',
  needs: ['waist', 'hip'],
  estimates: ['height', 'waistToHip'],
  design: [
    count('gores', 'Number of gores', 'skirt', { default: 6, min: 4, max: 12 }),
    length('length', 'Length from the waist', 'skirt', { default: 700, min: 500, max: 1200 }),
    length('waistEase', 'Waist ease', 'skirt', { default: 15, min: 0, max: 60 }),
    length('hipEase', 'Hip ease', 'skirt', { default: 50, min: 20, max: 160 }),
    choice('flareFrom', 'Flare from', 'skirt', ['the hip', 'above the hem']),
    length('hemFlare', 'Flare at each edge', 'skirt', { default: 60, min: 0, max: 100 }),
    length(
      'trumpetHeight',
      'Flare begins above the hem',
      'skirt',
      { default: 230, min: 150, max: 350 },
      { id: 'flareFrom', is: ['above the hem'] },
    ),
    ...waistbandDesign,
    waistEasedIn,
    choice('opening', 'Opening', 'opening', ['zip', 'side zip', 'none']),
    length(
      'zipLength',
      'Zip length',
      'opening',
      { default: 200, min: 150, max: 250 },
      { id: 'opening', is: ['zip', 'side zip'] },
    ),
    ...seamPockets(false),
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 10, min: 0, max: 20 }),
    length('sideAllowance', 'Seam allowance', 'allowances', { default: 15, min: 0, max: 30 }),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 25, min: 0, max: 40 }),
  ],
  rules: [
    lengthRule('waistEdge', 'Waist edge', 'waist + waistEase', geometry),
    lengthRule('goreWaist', 'Waist of a gore', 'waistEdge / gores', geometry),
    lengthRule('goreHip', 'Hip of a gore', 'max((hip + hipEase) / gores, goreWaist)'),
    lengthRule('goreHalfHip', 'Half the hip of a gore', 'goreHip / 2', geometry),
    lengthRule('goreShaping', 'Taken out at each edge', '(goreHip - goreWaist) / 2', geometry),
    lengthRule('hipLine', 'Hip below the waist', 'waistToHip'),
    lengthRule(
      'trumpetDrawn',
      'Flare begins above the hem, below the hip',
      'min(trumpetHeight, length - hipLine - 5cm)',
    ),
    lengthRule('flareDrawn', 'Flare of an edge', 'min(hemFlare, flareLength * 0.7)'),
    ...waistbandRules,
  ],
  found: { waistDrawn: 'length', flareLength: 'length' },
  draw(pen, use) {
    const gores = pen.value('gores')
    stateFlare(pen)
    const pieces = panelNames(gores, 'Gore').map(([id, name], index) =>
      drawGore(pen, use, { id, name, index, gores }),
    )
    sewPanels(pen, pieces, gores, use)
    fitGores(pen, pieces, gores, use)
    return waistOfPanels(pieces, gores)
  },
}

/** States over what length the gores flare, and says what had to be drawn otherwise than asked. */
function stateFlare(pen: Pen): void {
  const trumpet = pen.chosen('flareFrom') === 'above the hem'
  const long = trumpet ? pen.value('trumpetDrawn') : pen.value('length') - pen.value('hipLine')
  pen.find('flareLength', long, pen.usesOf(['flareFrom', 'trumpetDrawn', 'length', 'hipLine']))
  const lower = pen.value('trumpetHeight') - pen.value('trumpetDrawn')
  if (trumpet && lower > 0.01) {
    pen.caution(
      'flare-lowered',
      `The flare begins ${pen.say(lower)} lower than asked, to stay clear of the hip.`,
      'trumpetHeight',
      'length',
    )
  }
  const less = pen.value('hemFlare') - pen.value('flareDrawn')
  if (less > 0.01) {
    pen.caution(
      'flare-reduced',
      `Each edge flares by ${pen.say(less)} less than asked: more does not hang fair on this length.`,
      'hemFlare',
      'length',
    )
  }
  if (pen.value('goreShaping') > mostShaping) {
    pen.caution(
      'gore-shaping',
      `Each edge is shaped by ${pen.say(pen.value('goreShaping'))} over the hip. Choose more gores: they lie flatter.`,
      'gores',
      'waist',
      'hip',
    )
  }
}

function fitGores(pen: Pen, pieces: readonly PiecePen[], gores: number, use: SkirtUse): void {
  const waist = overPanels(pieces, gores, 'waist')
  const drawn = waist.reduce((sum, one) => sum + one.times * one.length, 0)
  pen.find('waistDrawn', drawn, pen.usesOf(['goreWaist', 'goreHalfHip', 'hipLine']))
  waistGirth(pen, waist, use)
  const hip = pieces.map((gore, index) => {
    const level = gore.lines.find((line) => line.id === 'hip-level')
    const times = waist[index]?.times ?? 2
    const path = level?.path ?? gore.edge('waist').path
    return { piece: gore.id, path, times, length: pathLength(path) }
  })
  hipGirth(pen, hip, 'hipEase')
  pen.fit(fitAcross('hem', 'shown', 0, undefined, overPanels(pieces, gores, 'hem')))
  bandOnPanels(pen, pieces, gores, use)
}
