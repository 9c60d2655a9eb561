import { taken, type TapeMeasurement } from '../tape-measurement'

const group = 'arm'

export const arm: readonly TapeMeasurement[] = [
  taken('upperArm', 'girth', group, {
    name: 'Upper arm',
    how: 'Round the fullest part of the upper arm, the arm hanging and loose.',
    standard: 'Upper arm girth (ISO 8559-1)',
    range: [18, 57],
    level: 0.27,
  }),
  taken('shoulderToElbow', 'length', group, {
    name: 'Shoulder to elbow',
    how: 'From the shoulder end down the outside of the bent arm to the point of the elbow.',
    standard: 'Upper arm length (ISO 8559-1)',
    range: [24, 42],
    level: 0.37,
  }),
  taken('elbow', 'girth', group, {
    name: 'Elbow',
    how: 'Round the elbow with the arm bent to a right angle.',
    standard: 'Elbow girth (ISO 8559-1)',
    range: [19, 45],
    level: 0.37,
  }),
  taken('armLength', 'length', group, {
    name: 'Arm length',
    how: 'From the shoulder end over the elbow of the slightly bent arm to the wrist bone.',
    standard: 'Arm length (ISO 8559-1)',
    range: [40, 68],
    level: 0.5,
  }),
  taken('wrist', 'girth', group, {
    name: 'Wrist',
    how: 'Round the wrist over the bone.',
    standard: 'Wrist girth (ISO 8559-1)',
    range: [12, 20],
    level: 0.5,
  }),
  taken('hand', 'girth', group, {
    name: 'Hand',
    how: 'Round the knuckles with the thumb held out: a cuff without an opening must pass it.',
    standard: 'Hand girth (ISO 8559-1)',
    range: [15, 24],
    level: 0.55,
  }),
]
