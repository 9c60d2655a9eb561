import type { Path } from '../../contract'
import { arcPath, mirrorX, reversePath } from '../../geometry'
import { choice, count, length } from '../../pen/design'
import { angleRule, geometry, lengthRule } from '../../pen/garment'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'
import { pinned } from '../fitted-waist'
import { seamPockets } from '../pockets/in-seam'
import { takeIn } from '../take-in'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../waistband'
import { drawCircleHalves } from './circle-halves'
import { atWaist, byCompass, fitArcs, levelOf } from './circle-levels'
import { waistGirth } from './fits'
import {
  bandOnPanels,
  overPanels,
  panelNames,
  seamsOfEdge,
  sewPanels,
  timesCut,
  waistOfPanels,
} from './panels'
import { skirtPiece, waistFinish, type Skirt, type SkirtUse } from './skirt'

/** Shares of a circle by their names in the style. */
export const shares: Readonly<Record<string, number>> = {
  '1/4': 0.25,
  '1/2': 0.5,
  '3/4': 0.75,
  '1': 1,
  '1 1/2': 1.5,
}

/** A skirt cut as a share of a circle, in one or more equal panels. A panel spans at most half a circle. */
export const circle: Skirt = {
  name: 'Circle skirt',
  needs: ['waist'],
  estimates: ['hip', 'waistToHip', 'bust'],
  design: [
    choice('share', 'Share of a circle', 'skirt', ['1/2', '1/4', '3/4', '1', '1 1/2']),
    count('panels', 'Number of panels', 'skirt', { default: 2, min: 1, max: 8 }),
    length('length', 'Length from the waist', 'skirt', { default: 600, min: 250, max: 1200 }),
    length('waistEase', 'Waist ease', 'skirt', { default: 15, min: -20, max: 50 }),
    length('hipEase', 'Hip ease', 'skirt', { default: 50, min: 0, max: 150 }),
    ...waistbandDesign,
    waistEasedIn,
    choice('opening', 'Opening', 'opening', ['zip', 'none']),
    length(
      'zipLength',
      'Zip length',
      'opening',
      { default: 200, min: 120, max: 300 },
      { id: 'opening', is: ['zip'] },
    ),
    ...seamPockets(false),
    length('waistAllowance', 'Waist allowance', 'allowances', { default: 10, min: 0, max: 20 }),
    length('sideAllowance', 'Seam allowance', 'allowances', { default: 15, min: 0, max: 30 }),
    length('hemAllowance', 'Hem allowance', 'allowances', { default: 15, min: 0, max: 30 }),
  ],
  rules: [
    lengthRule('waistEdge', 'Waist edge', 'waist + waistEase', geometry),
    lengthRule('radius', 'Radius of the waist', 'waistEdge / (2 * pi * circleShare)', geometry),
    lengthRule('hemRadius', 'Radius of the hem', 'radius + length', geometry),
    angleRule('panelAngle', 'Angle of a panel', 'circleAngle / panelCount', geometry),
    ...waistbandRules,
  ],
  found: { circleShare: 'number', circleAngle: 'angle', panelCount: 'number', waistDrawn: 'length' },
  draw(pen, use) {
    const share = shares[String(pen.chosen('share'))] as number
    pen.find('circleShare', share, pen.usesOf(['share']))
    if (use.sewnTo) return drawCircleHalves(pen, { ...use, sewnTo: use.sewnTo })
    const panels = enoughPanels(pen, share)
    pen.find('circleAngle', share * 360, pen.usesOf(['share']))
    pen.find('panelCount', panels, pen.usesOf(['share', 'panels']))
    const pieces = panelNames(panels).map(([id, name], index) =>
      drawPanel(pen, use, { id, name, index, panels }),
    )
    sewPanels(pen, pieces, panels, use)
    fitSkirt(pen, pieces, panels, use)
    return waistOfPanels(pieces, panels)
  },
}

/** A panel spans at most half a circle: with fewer panels asked for, the fewest that will do are drawn, and it is said. */
function enoughPanels(pen: Pen, share: number): number {
  const asked = pen.value('panels')
  const least = Math.ceil(share * 2)
  if (asked >= least) return asked
  pen.caution(
    'panels-added',
    `A panel spans at most half a circle, so this skirt is drawn in ${least} panels instead of ${asked}.`,
    'panels',
    'share',
  )
  return least
}

/** One of so many panels. */
interface Panel {
  readonly id: string
  readonly name: string
  readonly index: number
  readonly panels: number
}

function drawPanel(pen: Pen, use: SkirtUse, { id, name, index, panels }: Panel): PiecePen {
  const panel = skirtPiece(pen, use, id, name, byCompass)
  const half = pen.value('panelAngle') / 2
  const radius = pen.length('radius')
  const outer = pen.length('hemRadius')
  const apex = { x: 0, y: -radius }
  const [from, to] = [90 + half, 90 - half]
  panelMarks(pen, panel, from, to)
  const edge = (side: 'left' | 'right'): Path =>
    takeIn(pen, panel, straight(panel.at('waistRight'), panel.at('hemRight')), {
      seams: seamsOfEdge(panels, index, side).map((seam) => `${use.prefix}${seam}`),
      ends: 'stay',
      alongSeam: true,
      origin: use.origin,
      instead: atWaist,
      ...(side === 'left' ? { turned: mirrorX, suffix: '-left' } : {}),
    }).path
  panel.curve(
    'waist',
    pinned(arcPath(apex, radius, from, to), panel.at('waistLeft'), panel.at('waistRight')),
    'waistLeft',
    'waistRight',
    {
      role: 'waist',
      allowance: 'waistAllowance',
      finish: waistFinish(pen, use),
      say: 'Swing the waist',
      uses: ['radius', 'panelAngle'],
    },
  )
  const seam = { role: 'seam', allowance: 'sideAllowance', kind: 'line' } as const
  panel.curve(
    'right',
    pinned(edge('right'), panel.at('waistRight'), panel.at('hemRight')),
    'waistRight',
    'hemRight',
    { ...seam, say: 'Join waist to hem' },
  )
  panel.curve(
    'hem',
    pinned(arcPath(apex, outer, to, from), panel.at('hemRight'), panel.at('hemLeft')),
    'hemRight',
    'hemLeft',
    {
      role: 'hem',
      allowance: 'hemAllowance',
      corner: 'turned',
      say: 'Swing the hem',
      uses: ['hemRadius', 'panelAngle'],
    },
  )
  panel.curve(
    'left',
    pinned(reversePath(edge('left')), panel.at('hemLeft'), panel.at('waistLeft')),
    'hemLeft',
    'waistLeft',
    { ...seam, corner: 'turned', say: 'Join hem to waist' },
  )
  panel.grain({ x: 0, y: (outer - radius) * 0.25 }, { x: 0, y: (outer - radius) * 0.8 })
  return panel
}

function panelMarks(pen: Pen, panel: PiecePen, from: number, to: number): void {
  panel.start(
    'waistMiddle',
    { x: 0, y: 0 },
    'Mark the middle of the waist on a line that lies with the grain',
  )
  panel.go('apex', 'waistMiddle', 'up', 'radius', { say: 'Go up the radius: here the tape is held' })
  panel.go('hemMiddle', 'waistMiddle', 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  const { id } = panel
  pen.tag({ piece: id, from: 'waistMiddle', to: 'hemMiddle', label: 'Length', value: 'length' })
  pen.tag({ piece: id, from: 'apex', to: 'waistMiddle', label: 'Radius', step: `${id}.apex` })
  const place = (mark: string, by: string, degrees: number, say: string): void => {
    const turn = (degrees * Math.PI) / 180
    panel.aim(mark, 'apex', { x: Math.cos(turn), y: Math.sin(turn) }, pen.length(by), {
      say,
      by,
      uses: ['panelAngle'],
    })
  }
  place('waistLeft', 'radius', from, 'Turn the tape half the angle to one side and mark the waist')
  place('waistRight', 'radius', to, 'Turn it half the angle to the other side and mark the waist')
  place('hemRight', 'hemRadius', to, 'On the same line mark the hem')
  place('hemLeft', 'hemRadius', from, 'On the first line mark the hem')
}

function fitSkirt(pen: Pen, pieces: readonly PiecePen[], panels: number, use: SkirtUse): void {
  const waist = overPanels(pieces, panels, 'waist')
  const drawn = waist.reduce((sum, one) => sum + one.times * one.length, 0)
  pen.find('waistDrawn', drawn, pen.usesOf(['radius', 'panelAngle']))
  waistGirth(pen, waist, use)
  pen.fit(fitAcross('hem', 'shown', 0, undefined, overPanels(pieces, panels, 'hem')))
  const half = pen.value('panelAngle') / 2
  const level = levelOf(pen, pen.length('radius'), 90 + half, 90 - half)
  fitArcs(
    pen,
    pieces.map((panel, index) => ({ panel, ends: ['left', 'right'], times: timesCut(panels, index) })),
    level,
  )
  bandOnPanels(pen, pieces, panels, use)
}
