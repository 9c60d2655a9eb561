import 'server-only'
import type { Draft } from '@/drafting/contract'
import { layOutOf } from './choices'
import type { PrintQuery } from './choices'
import { download } from './download'
import { patternInThread } from './pattern-thread'
import { titleOf } from './pattern-of'
import type { Printable } from './pattern-of'
import { patternSvg } from './pattern-svg'

/**
 * The paper pattern of a version as a file to save.
 * @param signal of whoever waits: when they go away, the work is stopped
 */
export async function pdfAnswer(
  printable: Printable,
  draft: Draft,
  query: PrintQuery,
  signal?: AbortSignal,
): Promise<Response> {
  const request = {
    ...layOutOf(draft, query),
    title: titleOf(printable),
    black: query.ink === 'black',
    bold: query.lines === 'bold',
    savedAt: new Date(printable.savedAt),
  }
  const bytes = await patternInThread(request, signal).catch((error: unknown) => {
    if (signal?.aborted) return null
    throw error
  })
  // Nobody reads this answer: who asked has gone away.
  if (!bytes) return new Response(null, { status: 499 })
  return download(new Uint8Array(bytes), 'application/pdf', [
    printable.name,
    request.paper.name,
    ...(query.scale === 'full' ? [] : [`${query.scale} size`]),
    nett(query.allowances),
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
