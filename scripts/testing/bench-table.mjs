/**
 * @typedef {object} BenchResult as tests/bench/support/bench.ts reports it; times in milliseconds
 * @property {string} name
 * @property {number} median
 * @property {number} p95
 * @property {number} [aim]
 * @property {number} [aim95]
 * @property {string} [against]
 * @property {string} [note]
 */

/**
 * The results of one file as lines of a table.
 * @param {BenchResult[]} results
 * @returns {string[][]}
 */
export function benchRows(results) {
  return results.map((result) => [
    result.name,
    duration(result.median),
    duration(result.p95),
    aimOf(result),
    verdict(result),
    ratio(result, results),
    result.note ?? '',
  ])
}

export const benchHeadings = ['what', 'median', 'p95', 'aim', '', 'ratio', 'note']

/** Lines of equal columns; numbers stand to the right. */
export function alignedTable(headings, rows) {
  const all = [headings, ...rows]
  const widths = headings.map((_, column) => Math.max(...all.map((row) => row[column].length)))
  const numeric = new Set([1, 2])
  return all.map((row) =>
    row
      .map((cell, column) =>
        numeric.has(column) ? cell.padStart(widths[column]) : cell.padEnd(widths[column]),
      )
      .join('  ')
      .trimEnd(),
  )
}

/** A duration in the unit that reads best. */
export function duration(milliseconds) {
  const [value, unit] =
    milliseconds >= 1000
      ? [milliseconds / 1000, 's']
      : milliseconds >= 1
        ? [milliseconds, 'ms']
        : milliseconds >= 1e-3
          ? [milliseconds * 1e3, 'µs']
          : [milliseconds * 1e6, 'ns']
  return `${value >= 100 ? value.toFixed(0) : value.toPrecision(3)} ${unit}`
}

function aimOf({ aim, aim95 }) {
  if (aim === undefined && aim95 === undefined) return ''
  return `≤ ${[aim, aim95].map((value) => (value === undefined ? '–' : duration(value))).join(' / ')}`
}

function verdict({ median, p95, aim, aim95 }) {
  if (aim === undefined && aim95 === undefined) return ''
  return median <= (aim ?? Infinity) && p95 <= (aim95 ?? Infinity) ? 'met' : 'missed'
}

function ratio({ median, against }, results) {
  const other = against && results.find(({ name }) => name === against)
  return other ? `${(other.median / median).toPrecision(3)} × as fast` : ''
}
