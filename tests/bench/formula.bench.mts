import { completeCard, reviewMeasurements } from '../../drafting/body'
import { parseLength } from '../../drafting/lengths'
import { evaluateFormula, explainFormula, parseFormula } from '../../drafting/rules'
import { bench } from './support/bench'

const kinds = { bust: 'length', bustEase: 'length' } as const
const values = { bust: 889, bustEase: 80 }
/** A little wider each time, so that nothing can be worked out beforehand. */
function drag(): typeof values {
  values.bust = values.bust > 1200 ? 889 : values.bust + 0.5
  return values
}
const short = parseFormula('bust / 6 + 1.5in')
const long = parseFormula('(bust + bustEase) / 4 + max(bust / 8, bustEase × 2) × 0.5 − 1/2 in')
const { card } = completeCard({ bust: 920, waist: 740, hip: 980 })

let turn = 0
/** A new text each time, so that nothing is remembered. */
function unseen(): string {
  turn = (turn + 1) % 5_000
  return `(bust + bustEase) / 4 + ${turn}.5mm`
}

await bench('formula, worked out: bust / 6 + 1.5in', () => evaluateFormula(short, drag()), { aim: 0.0001 })
await bench('formula, worked out: five operations and max', () => evaluateFormula(long, drag()), {
  aim: 0.0002,
})
await bench('formula, its sum in words', () => explainFormula(short, drag(), kinds, 'in', 186.27), {
  aim: 0.005,
})
await bench('formula, read for the first time', () => parseFormula(unseen()), { aim: 0.01 })
await bench('length, read: 36 1/2 in', () => parseLength('36 1/2 in', 'in'), { aim: 0.002 })
await bench('measure card, reviewed: 29 measurements', () => reviewMeasurements(card), { aim: 0.05 })
