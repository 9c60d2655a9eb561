import type { Path, Point, Run } from '../contract'
import { arcPath, pathLength } from '../geometry'
import { choice, count, length } from '../pen/design'
import { angleRule, garment, geometry, lengthRule } from '../pen/garment'
import { fitAcross, type Pen } from '../pen/pen'
import type { PiecePen } from '../pen/piece-pen'
import { pocketBag, pocketDesign, pocketMouth, sewWithPocket } from '../parts/in-seam-pocket'
import { waistband, waistbandDesign, waistbandRules, waistEasedIn } from '../parts/waistband'

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

/** One drawn panel for every mirrored pair, and one that is its own mirror image when their number is odd. */
function panelNames(panels: number): readonly (readonly [string, string])[] {
  const drawn = Math.ceil(panels / 2)
  if (drawn === 1) return [['panel', 'Panel']]
  return Array.from({ length: drawn }, (_, index) => [`panel-${index + 1}`, `Panel ${index + 1}`] as const)
}

/** Whether the first drawn panel is the odd one out, cut once and symmetrical. */
const hasSingle = (panels: number): boolean => panels % 2 === 1

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

const left = (panel: PiecePen): Run => ({ piece: panel.id, edge: 'left' })
const right = (panel: PiecePen): Run => ({ piece: panel.id, edge: 'right' })
const mirrored = (run: Run): Run => ({ ...run, mirrored: true })
const reversed = (run: Run): Run => ({ ...run, reversed: true })

function sewPanels(pen: Pen, pieces: readonly PiecePen[], panels: number): void {
  const single = hasSingle(panels)
  pieces.forEach((panel, index) => {
    const once = single && index === 0
    panel.cut({ cloth: 'main', count: once ? 1 : 2, onFold: false, handed: !once })
  })
  const first = pieces[0] as PiecePen
  const last = pieces[pieces.length - 1] as PiecePen
  const long = first.lengthOf('right')
  const plain = (id: string, name: string, a: Run, b: Run): void =>
    pen.sew({ id, name, a: [a], b: [b], smooth: true })
  const withPocket = choosePocket(pen, first, panels)
  pen.settle()
  if (panels === 1) plain('seam', 'Seam', right(first), reversed(left(first)))
  else {
    if (!single) {
      if (withPocket && panels === 2)
        sewWithPocket(
          pen,
          { id: 'side', name: 'Side seam', smooth: true },
          reversed(left(first)),
          mirrored(reversed(left(first))),
          withPocket,
          long,
        )
      else plain('first', 'First seam', left(first), mirrored(left(first)))
    } else {
      // The single panel joins both halves of the next pair.
      const next = pieces[1] as PiecePen
      plain('first-left', 'First panel, left', left(first), mirrored(left(next)))
    }
    for (let index = 1; index < pieces.length; index += 1) {
      const a = right(pieces[index - 1] as PiecePen)
      const b = reversed(left(pieces[index] as PiecePen))
      const seam = { id: `seam-${index}`, name: `Panel ${index} to panel ${index + 1}`, smooth: true }
      if (withPocket && index === 1) sewWithPocket(pen, seam, a, b, withPocket, long)
      else pen.sew({ ...seam, a: [a], b: [b] })
    }
    plain('last', 'Last seam, with the opening', right(last), mirrored(right(last)))
  }
  if (pen.chosen('opening') === 'zip') {
    const zip = pen.length('zipLength')
    last.notch('zip-end', 'right', Math.min(zip, long), 2)
    pen.notion({ kind: 'zip', length: zip, count: 1 })
  } else if (pen.has('hip') && pen.value('waistEdge') < pen.value('hip')) {
    pen.caution(
      'no-opening',
      'Without an opening the waist does not go over the hip. Choose a zip, or make the waist of stretch cloth.',
      'opening',
      'hip',
    )
  }
}

/** Where a pocket goes: into the seam between the first two panels, or the first seam of two. With an odd number one side has it. */
function choosePocket(pen: Pen, first: PiecePen, panels: number): ReturnType<typeof pocketMouth> {
  if (!pen.chosen('pockets')) return undefined
  if (panels === 1) {
    pen.caution(
      'pockets-left-out',
      'One panel has one seam, and the opening is in it: no pockets are drawn.',
      'pockets',
      'panels',
    )
    return undefined
  }
  const side = first.edge('right').path
  const mouth = pocketMouth(pen, alongFromTop(side), 0)
  if (mouth)
    pocketBag(pen, pathLength(side) - mouth.from - 40, first.edge('right').uses | pen.usesOf(['pocketTop']))
  return mouth
}

/** The side seam laid straight down, so that the pocket's place is measured along it. */
function alongFromTop(side: Path): Path {
  return {
    closed: false,
    segments: [{ kind: 'line', from: { x: 0, y: 0 }, to: { x: 0, y: pathLength(side) } }],
  }
}

function fitSkirt(pen: Pen, pieces: readonly PiecePen[], panels: number): void {
  const times = (index: number): number => (hasSingle(panels) && index === 0 ? 1 : 2)
  const over = (edge: string) =>
    pieces.map((panel, index) => ({
      piece: panel.id,
      path: panel.edge(edge).path,
      times: times(index),
      length: panel.lengthOf(edge),
    }))
  const waist = over('waist')
  const drawn = waist.reduce((sum, one) => sum + one.times * one.length, 0)
  pen.find('waistDrawn', drawn, pen.usesOf(['radius', 'panelAngle']))
  const asked = pen.tape ? drawn - pen.value('waist') : pen.value('waistEase')
  pen.fit(fitAcross('waist', 'equal', asked, pen.value('waist'), waist))
  pen.fit(fitAcross('hem', 'shown', 0, undefined, over('hem')))
  fitHip(pen, pieces, times)
  if (!pen.chosen('waistband')) return
  const runs = pieces.flatMap((panel, index): Run[] => {
    const run = { piece: panel.id, edge: 'waist' }
    return times(index) === 1 ? [run] : [run, mirrored(run)]
  })
  waistband(pen, runs)
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
