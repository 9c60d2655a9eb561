import { taken, type TapeMeasurement } from '../tape-measurement'

const group = 'whole body'

export const wholeBody: readonly TapeMeasurement[] = [
  taken('napeToFloor', 'length', group, {
    name: 'Nape to floor',
    how: 'From the bone at the nape straight down the back to the floor, without shoes.',
    standard: 'Cervical height (ISO 8559-1)',
    range: [115, 165],
    level: 1,
  }),
  taken('height', 'length', group, {
    name: 'Height',
    how: 'Standing upright without shoes, from the crown of the head to the floor.',
    standard: 'Stature (ISO 8559-1)',
    range: [135, 195],
    level: 1,
  }),
]
