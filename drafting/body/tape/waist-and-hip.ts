import { taken, type TapeMeasurement } from '../tape-measurement'

const group = 'waist and hip'

export const waistAndHip: readonly TapeMeasurement[] = [
  taken('napeToWaist', 'length', group, {
    name: 'Nape to waist',
    how: 'Down the middle of the back, from the bone at the nape to the cord that marks the waist.',
    standard: 'Back waist length (ISO 8559-1)',
    range: [33, 50],
    level: 0.37,
  }),
  taken('frontWaistLength', 'length', group, {
    name: 'Front waist length',
    how: 'From the side neck point over the bust point down to the cord that marks the waist.',
    standard: 'Side neck point over bust to waist (ISO 8559-1)',
    range: [36, 58],
    level: 0.37,
  }),
  taken('centreFrontToWaist', 'length', group, {
    name: 'Centre front to waist',
    how: 'Down the middle of the front, from the hollow of the neck to the cord that marks the waist.',
    standard: 'Front neck point to waist (ISO 8559-1)',
    range: [26, 44],
    level: 0.37,
  }),
  taken('waist', 'girth', group, {
    name: 'Waist',
    how: 'Tie a cord round the body, let it settle where the body bends, and measure along it: the natural waist of dressmaking, which need not be the level midway between lowest rib and hip bone that the standard means.',
    standard: 'Waist girth (ISO 8559-1, taken there midway between lowest rib and hip bone)',
    range: [50, 178],
    level: 0.37,
  }),
  taken('highHip', 'girth', group, {
    name: 'High hip',
    how: 'Level round the body halfway between waist and hip, about 10 cm below the waist.',
    standard: 'Top hip girth (ISO 8559-1)',
    range: [62, 175],
    level: 0.43,
  }),
  taken('hip', 'girth', group, {
    name: 'Hip',
    how: 'Level round the fullest part of the seat, feet together.',
    standard: 'Hip girth (ISO 8559-1)',
    range: [74, 180],
    level: 0.49,
  }),
  taken('waistToHip', 'length', group, {
    name: 'Waist to hip',
    how: 'Down the side, from the cord that marks the waist to the level of the hip.',
    standard: 'Waist to hip (ISO 8559-1)',
    range: [10, 31],
    level: 0.49,
  }),
  taken('waistToKnee', 'length', group, {
    name: 'Waist to knee',
    how: 'Down the front, from the cord that marks the waist to the middle of the kneecap.',
    standard: 'Waist to knee (ISO 8559-1)',
    range: [44, 72],
    level: 0.72,
  }),
  taken('waistToFloor', 'length', group, {
    name: 'Waist to floor',
    how: 'Down the side, from the cord that marks the waist over the hip and straight to the floor, without shoes.',
    standard: 'Outside leg length (ISO 8559-1)',
    range: [85, 125],
    level: 1,
  }),
]
