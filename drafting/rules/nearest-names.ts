/** Letters to change, add, drop or swap with the next to get from one word to the other. */
function changesBetween(a: string, b: string): number {
  let before: number[] = []
  let row = Array.from({ length: b.length + 1 }, (_, i) => i)
  for (let i = 1; i <= a.length; i += 1) {
    const next = [i]
    for (let j = 1; j <= b.length; j += 1) {
      const replaced = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1)
      const swapped =
        a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1] ? (before[j - 2] ?? Infinity) + 1 : Infinity
      next.push(Math.min(replaced, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1, swapped))
    }
    before = row
    row = next
  }
  return row[b.length] ?? 0
}

/**
 * The known names most like a mistyped one: at most three, the nearest first, none when nothing is near.
 * A name that holds the typed one (`depth` in `armholeDepth`) counts as near.
 */
export function nearestNames(typed: string, known: readonly string[]): readonly string[] {
  const wanted = typed.slice(0, 60).toLowerCase()
  const limit = Math.max(1, Math.floor(wanted.length / 3))
  return known
    .map((name) => {
      const lower = name.toLowerCase()
      const holds = wanted.length >= 3 && lower.includes(wanted)
      return { name, changes: holds ? 1 : changesBetween(wanted, lower) }
    })
    .filter(({ changes }) => changes <= limit)
    .sort((a, b) => a.changes - b.changes || a.name.localeCompare(b.name, 'en'))
    .slice(0, 3)
    .map(({ name }) => name)
}
