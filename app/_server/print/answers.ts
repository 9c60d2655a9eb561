import 'server-only'
import type { Draft } from '@/drafting/contract'
import { paperOf } from '@/drafting/drawing'
import type { Orientation, PaperId } from '@/drafting/drawing'
import { download } from './download'
import { patternInThread } from './pattern-thread'
import { titleOf } from './pattern-of'
import type { Printable } from './pattern-of'
import { patternSvg } from './pattern-svg'

/** The paper pattern of a version as a file to save. */
export async function pdfAnswer(
  printable: Printable,
  draft: Draft,
  choices: { readonly paper: PaperId; readonly orientation: Orientation; readonly allowances: 'yes' | 'no' },
): Promise<Response> {
  const paper = paperOf(choices.paper)
  const bytes = await patternInThread({
    draft,
    title: titleOf(printable),
    paper,
    orientation: choices.orientation,
    allowances: choices.allowances === 'yes',
    savedAt: new Date(printable.savedAt),
  })
  return download(new Uint8Array(bytes), 'application/pdf', [
    printable.name,
    paper.name,
    nett(choices.allowances),
  ])
}

/** The pattern of a version on one sheet at true scale, as a file to save. */
export function svgAnswer(
  printable: Printable,
  draft: Draft,
  choices: { readonly allowances: 'yes' | 'no' },
): Response {
  const svg = patternSvg(draft, titleOf(printable), choices.allowances === 'yes')
  return download(svg, 'image/svg+xml', [printable.name, nett(choices.allowances)])
}

const nett = (allowances: 'yes' | 'no') => (allowances === 'yes' ? 'with allowances' : 'nett')
