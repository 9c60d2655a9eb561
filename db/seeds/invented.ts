/** Everything in the demo workroom. All people, addresses and bodies are invented. */

export const workroomName = 'Linden Lane Dressmaking (invented)'
export const workroomNote = 'A demo workroom. Everybody and every measurement in it is invented.'

export const people = [
  { key: 'owner', name: 'Adaeze Linden', email: 'owner@linden-lane.example', roles: ['owner'] },
  { key: 'drafter', name: 'Ruth Barlow', email: 'drafter@linden-lane.example', roles: ['drafter'] },
  { key: 'tutor', name: 'Tomas Pell', email: 'tutor@linden-lane.example', roles: ['tutor'] },
  { key: 'maker', name: 'Wanjiru Hale', email: 'maker@linden-lane.example', roles: ['maker'] },
  { key: 'student', name: 'Sofie Marsh', email: 'student@linden-lane.example', roles: ['student'] },
] as const

/** Names of measurements in the order of the columns of `bodies`. */
export const measured = [
  'height',
  'neckBase',
  'shoulderLength',
  'acrossShoulders',
  'acrossBack',
  'acrossFront',
  'bust',
  'bustHeight',
  'bustSpan',
  'waist',
  'hip',
  'napeToWaist',
  'frontWaistLength',
  'upperArm',
  'elbow',
  'wrist',
  'armLength',
  'waistToHip',
  'waistToKnee',
  'waistToFloor',
] as const

/** Inches, as they would be written on a card. */
export const bodies = {
  medium: `65 | 14 5/8 | 4 7/8 | 15 3/8 | 13 3/4 | 12 3/4 | 36 1/4 | 10 3/8 | 7 1/2 | 29 1/8 | 38 5/8 | 16 | 17 1/4 |
    11 1/4 | 10 | 6 1/4 | 22 7/8 | 8 | 23 1/2 | 41`,
  full: `64 1/2 | 16 3/8 | 5 1/4 | 16 3/4 | 16 1/8 | 15 1/8 | 48 | 12 3/8 | 9 5/8 | 42 1/2 | 50 3/8 | 16 1/2 | 19 1/8 |
    15 1/8 | 13 3/8 | 7 1/4 | 23 | 8 1/4 | 23 | 40 1/2`,
  small: `62 | 13 5/8 | 4 1/2 | 14 1/2 | 13 | 12 | 32 1/2 | 9 5/8 | 6 7/8 | 25 1/2 | 35 | 15 1/4 | 16 1/8 | 10 | 9 1/8 |
    5 7/8 | 21 1/2 | 7 1/2 | 22 1/4 | 38 3/4`,
  tall: `70 1/2 | 14 7/8 | 5 1/8 | 16 | 14 1/4 | 13 1/8 | 38 | 10 7/8 | 7 3/4 | 30 1/2 | 41 | 17 1/4 | 18 1/2 | 11 5/8 |
    10 3/8 | 6 5/8 | 24 3/4 | 8 1/2 | 25 1/4 | 44 1/2`,
  round: `63 1/4 | 15 1/4 | 4 7/8 | 15 7/8 | 14 7/8 | 13 7/8 | 42 | 11 3/8 | 8 1/2 | 36 1/2 | 44 | 15 7/8 | 17 7/8 |
    13 1/8 | 11 5/8 | 6 3/4 | 22 1/4 | 8 | 22 5/8 | 39 3/4`,
} as const

export const clients = [
  { name: 'Amara Obi', phone: '', body: 'medium', takenOn: '2026-10-12', note: 'Likes room to dance in.' },
  { name: 'Grace Lindqvist', phone: '', body: 'full', takenOn: '2026-10-20', note: '' },
  {
    name: 'Ines Duarte',
    phone: '',
    body: 'small',
    takenOn: '2026-11-02',
    note: 'Left shoulder sits a little lower.',
  },
  { name: 'Mei Tan', phone: '', body: 'tall', takenOn: '2026-11-09', note: '' },
  {
    name: 'Rosa Keller',
    phone: '',
    body: 'round',
    takenOn: '2026-11-21',
    note: 'Wedding guest, late in spring.',
  },
] as const

export const drafts = [
  {
    name: 'Flared dress for dancing',
    garment: 'flared-dress',
    client: 'Amara Obi',
    by: 'drafter',
    purpose: 'work',
  },
  { name: 'Circle skirt', garment: 'circle-skirt', client: 'Mei Tan', by: 'owner', purpose: 'work' },
  { name: 'Guest dress', garment: 'flared-dress', client: 'Rosa Keller', by: 'drafter', purpose: 'work' },
  {
    name: 'Lesson one: the flared dress',
    garment: 'flared-dress',
    client: null,
    by: 'tutor',
    purpose: 'teaching',
  },
  { name: 'My first skirt', garment: 'circle-skirt', client: null, by: 'student', purpose: 'practice' },
] as const

/** The draft that the maker is to cut and sew. */
export const assigned = 'Flared dress for dancing'
