import type { DraftOrder } from '@/drafting/contract'

/** A version in a list. */
export interface VersionSummary {
  readonly id: string
  readonly kind: 'auto' | 'named'
  readonly name: string | null
  readonly conflict: boolean
  readonly savedAt: string
  readonly printed: boolean
  readonly shared: boolean
}

/** A version with its contents. */
export interface Version extends VersionSummary {
  readonly order: DraftOrder
  readonly typed: Readonly<Record<string, string>>
}

export interface SaveAnswer {
  readonly outcome: 'saved' | 'already-saved' | 'conflict'
  readonly head: Version
}

/** The server answered, and refused. */
export class Refused extends Error {
  constructor(
    readonly status: number,
    message: string,
    readonly problems: readonly { readonly field: string; readonly message: string }[],
  ) {
    super(message)
  }
}

/**
 * Asks our own server for JSON.
 * @throws Refused with its words; TypeError when it could not be reached
 */
export async function ask<T>(path: string, init: RequestInit & { readonly json?: unknown } = {}): Promise<T> {
  const { json, ...rest } = init
  const sent = json === undefined ? rest : { ...rest, body: JSON.stringify(json) }
  const response = await fetch(path, {
    method: json === undefined ? 'GET' : 'POST',
    ...sent,
    headers: json === undefined ? undefined : { 'content-type': 'application/json' },
  })
  const answer = (await response.json().catch(() => undefined)) as
    { ok: true; value: T } | { ok: false; problems: { field: string; message: string }[] } | undefined
  if (answer?.ok) return answer.value
  const problems = answer?.problems ?? []
  throw new Refused(
    response.status,
    problems[0]?.message ?? 'The server could not do this just now.',
    problems,
  )
}
