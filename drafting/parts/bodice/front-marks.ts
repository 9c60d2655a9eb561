import { towards } from '../../geometry'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'
import { chosenNeckline } from '../necklines'
import { neckOpens, openNeck } from '../open-neck'
import { deepened } from './back-marks'

/** Marks of neck, shoulder, bust and levels, in drafting order. */
export function bodiceFrontMarks(pen: Pen, front: PiecePen): void {
  const { depth, widening } = chosenNeckline(pen)
  pen.find(
    'frontNeckFall',
    neckOpens(pen, pen.length('frontShoulder')).open * Math.sin((pen.value('frontSlope') * Math.PI) / 180),
    pen.usesOf([widening, 'frontSlope', 'frontShoulder']),
  )
  front.start('neckLevel', { x: 0, y: 0 }, 'Fold the cloth; mark the level of the side neck on the centre')
  front.go('neckPoint', 'neckLevel', 'right', 'frontNeckWidth', {
    say: 'Go across the width of the front neck',
    round: 'up',
    shared: true,
  })
  front.go('centreNeck', 'neckLevel', 'down', depth, {
    say: 'Come down the depth of the front neck',
    drag: ['frontNeckDrop'],
  })
  pen.tag({
    piece: 'front',
    from: 'neckLevel',
    to: 'centreNeck',
    label: 'Neck depth',
    value: 'frontNeckDrop',
    over: pen.length(depth) - pen.value('frontNeckDrop'),
  })
  const shoulder = towards(pen.value('frontSlope'))
  openNeck(pen, front, shoulder, pen.length('frontShoulder'), { uses: ['frontSlope', 'frontShoulder'] })
  front.aim('shoulderTip', 'neckPoint', shoulder, pen.length('frontShoulder'), {
    say: 'Down the slope go the length of the shoulder',
    by: 'frontShoulder',
    uses: ['frontSlope'],
    drag: ['frontSlope'],
    shared: true,
  })
  front.go('bustLevel', 'neckLevel', 'down', 'bustHeight', { say: 'Come down the bust height' })
  front.go('bustPoint', 'bustLevel', 'right', 'bustPointOut', {
    say: 'Go across half the bust span: here is the bust point',
    kind: 'drill',
  })
  front.go('scyeLevel', 'neckLevel', 'down', 'frontScye', { say: 'Come down to the level of the underarm' })
  front.go('underarmClosed', deepened(pen, front), 'right', 'frontQuarter', {
    say: 'Go across a quarter of the bust with its ease: the underarm while the bust dart is closed',
    drag: ['bustEase'],
  })
  front.go('centreWaist', 'neckLevel', 'down', 'frontWaistLength', {
    say: 'Come down the front waist length',
  })
}
