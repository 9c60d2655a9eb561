/** What an edge is called where its id alone would be no word of the trade. */
const names: Readonly<Record<string, string>> = {
  outer: 'the outer edge',
  inner: 'the inner edge',
  opening: 'the opening at the centre',
  centre: 'the centre',
  side: 'the side seam',
  shoulder: 'the shoulder seam',
  'head-front': 'the front of the head',
  'head-back': 'the back of the head',
  'underarm-front': 'the front underarm seam',
  'underarm-back': 'the back underarm seam',
}

/** An edge as people say it at the table: 'the side seam', 'the neckline'. */
export function edgeName(edge: string): string {
  const bare = edge.replace(/-\d+$/, '')
  return names[bare] ?? `the ${bare.replace(/-/g, ' ')}`
}
