import type { Path, Point } from '../contract'
import { arcPath, pathLength } from '../geometry'
import { choice, count, length } from '../pen/design'
import { angleRule, garment, geometry, lengthRule } from '../pen/garment'
import { fitAcross, type Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { pocketDesign } from '../parts/in-seam-pocket'
import { bandOnPanels, overPanels, panelNames, sewPanels, timesCut } from '../parts/panels'
import { waistbandDesign, waistbandRules, waistEasedIn } from '../parts/waistband'

const shares: Readonly<Record<string, number>> = {
  '1/4': 0.25,
  '1/2': 0.5,
  '3/4': 0.75,
  '1': 1,
  '1 1/2': 1.5,
}

/** A skirt cut as a share of a circle, in one or more equal panels. A panel spans at most half a circle. */
export const circleSkirt = garment({
  id: 'circle-skirt',
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
    ...pocketDesign.map((value) => (value.id === 'pockets' ? { ...value, default: false } : value)),
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
  draft(pen) {
    const share = shares[String(pen.chosen('share'))] as number
    pen.find('circleShare', share, pen.usesOf(['share']))
    pen.find('circleAngle', share * 360, pen.usesOf(['share']))
    const panels = enoughPanels(pen, share)
    pen.find('panelCount', panels, pen.usesOf(['share', 'panels']))
    const pieces = panelNames(panels).map(([id, name]) => drawPanel(pen, id, name))
    sewPanels(pen, pieces, panels)
    fitSkirt(pen, pieces, panels)
  },
})

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

function drawPanel(pen: Pen, id: string, name: string): PiecePen {
  const panel = pen.piece(id, name)
  const half = pen.value('panelAngle') / 2
  const radius = pen.length('radius')
  const outer = pen.length('hemRadius')
  const apex = { x: 0, y: -radius }
  const [from, to] = [90 + half, 90 - half]
  panel.start(
    'waistMiddle',
    { x: 0, y: 0 },
    'Mark the middle of the waist on a line that lies with the grain',
  )
  panel.go('apex', 'waistMiddle', 'up', 'radius', { say: 'Go up the radius: here the tape is held' })
  panel.go('hemMiddle', 'waistMiddle', 'down', 'length', { say: 'Come down the length', drag: ['length'] })
  pen.tag({ piece: id, from: 'waistMiddle', to: 'hemMiddle', label: 'Length', value: 'length' })
  pen.tag({ piece: id, from: 'apex', to: 'waistMiddle', label: 'Radius', step: `${id}.apex` })
  const place = (mark: string, by: string, degrees: number, say: string): Point => {
    const turn = (degrees * Math.PI) / 180
    panel.aim(mark, 'apex', { x: Math.cos(turn), y: Math.sin(turn) }, pen.length(by), {
      say,
      by,
      uses: ['panelAngle'],
    })
    return panel.at(mark)
  }
  place('waistLeft', 'radius', from, 'Turn the tape half the angle to one side and mark the waist')
  place('waistRight', 'radius', to, 'Turn it half the angle to the other side and mark the waist')
  place('hemRight', 'hemRadius', to, 'On the same line mark the hem')
  place('hemLeft', 'hemRadius', from, 'On the first line mark the hem')
  panel.curve(
    'waist',
    exactEnds(arcPath(apex, radius, from, to), panel.at('waistLeft'), panel.at('waistRight')),
    'waistLeft',
    'waistRight',
    {
      role: 'waist',
      allowance: 'waistAllowance',
      finish: pen.chosen('waistband') ? 'seam' : 'bound',
      say: 'Swing the waist',
      uses: ['radius', 'panelAngle'],
    },
  )
  panel.line('right', 'waistRight', 'hemRight', {
    role: 'seam',
    allowance: 'sideAllowance',
    say: 'Join waist to hem',
  })
  panel.curve(
    'hem',
    exactEnds(arcPath(apex, outer, to, from), panel.at('hemRight'), panel.at('hemLeft')),
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
  panel.line('left', 'hemLeft', 'waistLeft', {
    role: 'seam',
    allowance: 'sideAllowance',
    corner: 'turned',
    say: 'Join hem to waist',
  })
  panel.grain({ x: 0, y: (outer - radius) * 0.25 }, { x: 0, y: (outer - radius) * 0.8 })
  return panel
}

/** An arc's ends are worked out twice; the marks are the ones that count. */
function exactEnds(path: Path, from: Point, to: Point): Path {
  const last = path.segments.length - 1
  return {
    closed: false,
    segments: path.segments.map((segment, index) => ({
      ...segment,
      ...(index === 0 ? { from } : {}),
      ...(index === last ? { to } : {}),
    })),
  }
}

function fitSkirt(pen: Pen, pieces: readonly PiecePen[], panels: number): void {
  const waist = overPanels(pieces, panels, 'waist')
  const drawn = waist.reduce((sum, one) => sum + one.times * one.length, 0)
  pen.find('waistDrawn', drawn, pen.usesOf(['radius', 'panelAngle']))
  const asked = pen.tape ? drawn - pen.value('waist') : pen.value('waistEase')
  pen.fit(fitAcross('waist', 'equal', asked, pen.value('waist'), waist))
  pen.fit(fitAcross('hem', 'shown', 0, undefined, overPanels(pieces, panels, 'hem')))
  fitHip(pen, pieces, (index) => timesCut(panels, index))
  bandOnPanels(pen, pieces, panels)
}

/** At the hip the level is an arc. Too narrow there is drawn all the same, and said. */
function fitHip(pen: Pen, pieces: readonly PiecePen[], times: (index: number) => number): void {
  if (!pen.has('hip')) {
    pen.caution(
      'hip-unknown',
      'The hip was not measured, so nobody can say whether the skirt is wide enough there. Measure the hip.',
      'hip',
    )
    return
  }
  const down = pen.value('waistToHip')
  if (down >= pen.length('length')) return
  const radius = pen.length('radius') + down
  const half = pen.value('panelAngle') / 2
  const path = arcPath({ x: 0, y: -pen.length('radius') }, radius, 90 + half, 90 - half)
  const across = pieces.map((panel, index) => ({
    piece: panel.id,
    path,
    times: times(index),
    length: pathLength(path),
  }))
  const girth = across.reduce((sum, one) => sum + one.times * one.length, 0)
  const wanted = pen.value('hip') + pen.value('hipEase')
  pen.fit(
    fitAcross('hip', girth >= wanted ? 'at-least' : 'shown', pen.value('hipEase'), pen.value('hip'), across),
  )
  if (girth >= wanted) return
  pen.caution(
    'hip-tight',
    `At the hip the skirt is ${pen.say(girth)} round, the body with ease ${pen.say(wanted)}. Take a larger share of a circle.`,
    'share',
    'hip',
  )
}
