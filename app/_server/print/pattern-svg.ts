import 'server-only'
import type { Draft } from '@/drafting/contract'
import { arrange, drawing, printLayers, toSvg } from '@/drafting/drawing'
import type { PatternTitle } from './pattern-title'

/** The whole pattern on one sheet at true scale: 1 mm in the file is 1 mm on a plotter or a projector. */
export function patternSvg(draft: Draft, title: PatternTitle, allowances: boolean): string {
  const places = arrange(draft, { allowances })
  const sheet = drawing(draft, { layers: printLayers, allowances, places, title })
  return toSvg(sheet, {
    title: [title.name, title.version, title.date].filter(Boolean).join(', '),
    description: `${title.garment}, ${allowances ? 'with allowances' : 'nett'}, 1 : 1`,
  })
}
