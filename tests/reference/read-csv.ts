import { readFileSync } from 'node:fs'

/** Splits one line at its commas, those inside double quotes apart. */
function cells(row: string): readonly string[] {
  return [...row.matchAll(/(?:^|,)(?:"([^"]*)"|([^,]*))/g)].map(([, quoted, plain]) => quoted ?? plain ?? '')
}

/** The rows of a table in `data/`, by the names in its head; lines that begin with # say where it is from. */
export function readCsv(name: string): readonly Readonly<Record<string, string>>[] {
  const text = readFileSync(new URL(`data/${name}`, import.meta.url), 'utf8')
  const [head = '', ...rows] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'))
  const names = cells(head)
  return rows.map((row) => Object.fromEntries(cells(row).map((cell, at) => [names[at] ?? '', cell])))
}
