import { towards } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { chosenNeckline } from '../necklines'
import { neckOpens, openNeck } from '../open-neck'

/**
 * Marks of neck, shoulder and levels of a fitted back, in drafting order.
 *
 * @param shoulder length of the front's shoulder seam as drawn, mm: however the tip is corrected, the seam still closes.
 */
export function bodiceBackMarks(pen: Pen, back: PiecePen, shoulder: number): void {
  const { widening } = chosenNeckline(pen)
  back.start('neckLevel', { x: 0, y: 0 }, 'Mark the level of the side neck on the centre')
  back.go('neckPoint', 'neckLevel', 'right', 'backNeckWidth', {
    say: 'Go across the width of the back neck',
    round: 'up',
    shared: true,
  })
  const slope = towards(pen.value('backSlope'))
  openNeck(pen, back, slope, pen.length('frontShoulder'), { uses: ['backSlope', 'frontShoulder'] })
  back.aim('shoulderMeasured', 'neckPoint', slope, pen.length('frontShoulder'), {
    say: 'Down the slope go the length of the shoulder',
    by: 'frontShoulder',
    uses: ['backSlope'],
  })
  back.aim('shoulderTip', 'shoulderMeasured', slope, pen.length('shoulderEase'), {
    say: 'Go on by the ease of the back shoulder',
    by: 'shoulderEase',
    uses: ['backSlope'],
    drag: ['backSlope'],
    shared: true,
    keeps: { from: back.at('sideNeck'), length: shoulder + pen.length('shoulderEase') },
  })
  pen.find(
    'neckFall',
    neckOpens(pen, pen.length('frontShoulder')).open * Math.sin((pen.value('backSlope') * Math.PI) / 180),
    pen.usesOf([widening, 'backSlope', 'frontShoulder']),
  )
  back.go('nape', 'neckLevel', 'down', 'napeDepth', { say: 'Come down to the nape' })
  back.go('centreNeck', 'neckLevel', 'down', 'backNeckDepth', {
    say: 'Come down the depth of the back neck',
    drag: ['backNeckDrop'],
  })
  back.go('scyeLevel', 'nape', 'down', 'scyeLine', {
    say: 'From the nape come down to the level of the underarm',
  })
  const level = deepened(pen, back)
  back.go('underarm', level, 'right', 'backQuarter', {
    say: 'Go across a quarter of the bust with its ease',
    drag: ['bustEase'],
    also: ['armholeDeepening'],
  })
  back.go('waistLevel', 'nape', 'down', 'napeToWaist', { say: 'From the nape come down to the waist' })
}

/** Deepens the armhole of a half below its rule where the arm needs room. @returns the mark on the level of the underarm */
export function deepened(pen: Pen, half: PiecePen): string {
  if (pen.value('armholeDeepening') <= 0) return 'scyeLevel'
  half.go('chestLevel', 'scyeLevel', 'down', 'armholeDeepening', {
    say: 'Deepen the armhole until there is room for the arm',
    stepKind: 'solve',
  })
  return 'chestLevel'
}
