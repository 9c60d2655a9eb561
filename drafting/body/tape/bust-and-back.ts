import { taken, type TapeMeasurement } from '../tape-measurement'

const group = 'bust and back'

export const bustAndBack: readonly TapeMeasurement[] = [
  taken('acrossBack', 'width', group, {
    name: 'Across back',
    how: 'Level across the back from armhole to armhole, halfway between shoulder and armpit, arms hanging.',
    standard: 'Back width (ISO 8559-1)',
    range: [28, 52],
    level: 0.21,
  }),
  taken('acrossFront', 'width', group, {
    name: 'Across front',
    how: 'Level across the chest from armhole to armhole, halfway between shoulder and armpit.',
    standard: 'Across chest (ISO 8559-1)',
    range: [26, 48],
    level: 0.21,
  }),
  taken('armscye', 'girth', group, {
    name: 'Armscye',
    how: 'Round the arm where it joins the body, over the shoulder end and through the armpit, arm hanging.',
    standard: 'Armscye girth (ISO 8559-1)',
    range: [30, 60],
    level: 0.22,
  }),
  taken('scyeDepth', 'length', group, {
    name: 'Scye depth',
    how: 'Down the middle of the back, from the bone at the nape to the level of the armpits.',
    standard: 'Scye depth (ISO 8559:1989)',
    range: [14, 27],
    level: 0.24,
  }),
  taken('upperBust', 'girth', group, {
    name: 'Upper bust',
    how: 'Round the chest high under the arms, above the fullness of the bust.',
    standard: 'Upper chest girth (ASTM D5219)',
    range: [66, 150],
    level: 0.25,
  }),
  taken('bust', 'girth', group, {
    name: 'Bust',
    how: 'Level round the fullest part of the bust, breathing easily, over the bra that will be worn.',
    standard: 'Bust girth (ISO 8559-1)',
    range: [68, 165],
    level: 0.28,
  }),
  taken('bustHeight', 'length', group, {
    name: 'Bust height',
    how: 'From the side neck point down over the chest to the bust point.',
    standard: 'Side neck point to bust point (ISO 8559-1)',
    range: [20, 40],
    level: 0.28,
  }),
  taken('bustSpan', 'width', group, {
    name: 'Bust span',
    how: 'Straight across from one bust point to the other.',
    standard: 'Bust point to bust point (ISO 8559-1)',
    range: [13, 30],
    level: 0.28,
  }),
  taken('underBust', 'girth', group, {
    name: 'Under bust',
    how: 'Level round the ribs just below the bust.',
    standard: 'Under-bust girth (ISO 8559-1)',
    range: [58, 145],
    level: 0.32,
  }),
]
