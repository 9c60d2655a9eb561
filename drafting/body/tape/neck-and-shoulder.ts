import { taken, type TapeMeasurement } from '../tape-measurement'

const group = 'neck and shoulder'

export const neckAndShoulder: readonly TapeMeasurement[] = [
  taken('head', 'girth', group, {
    name: 'Head',
    how: 'Level round the widest part of the head, over the hair as it is worn: a neckline without an opening must pass it.',
    standard: 'Head girth (ISO 8559-1)',
    range: [49, 66],
    level: 0.06,
  }),
  taken('neckBase', 'girth', group, {
    name: 'Neck base',
    how: 'Round the foot of the neck, over the bone at the nape, both side neck points and the hollow in front, where a necklace lies.',
    standard: 'Neck base girth (ISO 8559-1)',
    range: [29, 50],
    level: 0.15,
  }),
  taken('shoulderLength', 'length', group, {
    name: 'Shoulder length',
    how: 'Along the top of one shoulder, from the side neck point to the bone at the shoulder end.',
    standard: 'Shoulder length (ISO 8559-1)',
    range: [9.5, 18.5],
    level: 0.17,
  }),
  taken('acrossShoulders', 'width', group, {
    name: 'Across shoulders',
    how: 'Across the back from one shoulder end to the other, the tape lying over the bone at the nape.',
    standard: 'Shoulder width (ISO 8559-1)',
    range: [31, 50],
    level: 0.18,
  }),
]
