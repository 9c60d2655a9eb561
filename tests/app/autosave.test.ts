import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createAutosave } from '@/app/(studio)/_data/autosave'
import type { Version } from '@/app/(studio)/_data/api'
import type { LocalCopy } from '@/app/(studio)/_data/local-copy'
import type { SaveState } from '@/components/studio/save-state'

interface Sent {
  readonly revisionId: string
  readonly basedOn: string
  readonly kind: string
  readonly order: { readonly design?: { readonly width?: number } }
}

/** A network that keeps what was sent and answers what it is told to. */
function network(answers: (Response | 'lost')[]) {
  const sent: Sent[] = []
  vi.stubGlobal('fetch', async (_path: string, init: RequestInit) => {
    sent.push(JSON.parse(String(init.body)) as Sent)
    const answer = answers.shift() ?? saved()
    if (answer === 'lost') throw new TypeError('The network is gone.')
    return answer
  })
  return sent
}

const version = (id: string): Version => ({
  id,
  kind: 'auto',
  name: null,
  conflict: false,
  savedAt: '2026-03-14T10:00:00.000Z',
  printed: false,
  shared: false,
  order: content(0).order,
  typed: {},
})
const saved = () => Response.json({ ok: true, value: { outcome: 'saved', head: version('any') } })
const conflict = () => Response.json({ ok: true, value: { outcome: 'conflict', head: version('theirs') } })
const refused = (status: number, message: string) =>
  Response.json({ ok: false, problems: [{ field: '', message }] }, { status })
const content = (width: number) => ({
  order: { garment: 'bib', measurements: {}, design: { width } },
  typed: {},
})

function open() {
  const states: SaveState['kind'][] = []
  const local = new Map<string, LocalCopy>()
  const conflicts: Version[] = []
  let next = 0
  const autosave = createAutosave({
    draftId: 'draft',
    base: 'first',
    newId: () => `made-${(next += 1)}`,
    keep: async (copy) => void local.set(copy.draftId, copy),
    drop: async (headId) => {
      if (local.get('draft')?.headId === headId) local.delete('draft')
    },
    onState: (state) => states.push(state.kind),
    onConflict: (theirs) => conflicts.push(theirs),
  })
  return { autosave, states, local, conflicts }
}

beforeEach(() => {
  vi.useFakeTimers()
})
afterEach(() => {
  vi.useRealTimers()
  vi.unstubAllGlobals()
})

describe('autosave', () => {
  it('sends only the last of several changes, two seconds after it', async () => {
    const sent = network([])
    const { autosave, states } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(1500)
    autosave.change(content(2))
    await vi.advanceTimersByTimeAsync(1500)
    expect(sent).toHaveLength(0)
    await vi.advanceTimersByTimeAsync(600)
    expect(sent.map((each) => [each.order.design?.width, each.basedOn])).toEqual([[2, 'first']])
    expect(states.at(-1)).toBe('saved')
  })

  it('sends a version whose answer was lost again under the same id', async () => {
    const sent = network(['lost'])
    const { autosave, states, local } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    expect(states.at(-1)).toBe('offline')
    expect(local.get('draft')?.order.design).toEqual({ width: 1 })
    await autosave.retry()
    expect(sent.map((each) => each.revisionId)).toEqual(['made-1', 'made-1'])
    expect(states.at(-1)).toBe('saved')
    expect(local.size).toBe(0)
  })

  it('builds each version on the one before it', async () => {
    const sent = network([])
    const { autosave } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    autosave.change(content(2))
    await vi.advanceTimersByTimeAsync(2100)
    expect(sent.map((each) => each.basedOn)).toEqual(['first', 'made-1'])
  })

  it('stops at a conflict until the person has chosen, then goes on from the other version', async () => {
    const sent = network([conflict()])
    const { autosave, states, conflicts } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    autosave.change(content(2))
    await vi.advanceTimersByTimeAsync(20_000)
    expect(sent).toHaveLength(1)
    expect(states.at(-1)).toBe('conflict')
    expect(conflicts.map((each) => each.id)).toEqual(['theirs'])
    autosave.goOnFrom(version('theirs'), content(2))
    await vi.advanceTimersByTimeAsync(100)
    expect(sent.at(-1)).toMatchObject({ basedOn: 'theirs', order: { design: { width: 2 } } })
    expect(states.at(-1)).toBe('saved')
  })

  it('keeps the edit and says so when the session has ended', async () => {
    network([refused(401, 'You are signed out.')])
    const { autosave, states, local } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    expect(states.at(-1)).toBe('signed-out')
    expect(local.size).toBe(1)
    await autosave.retry()
    expect(states.at(-1)).toBe('saved')
  })

  it('tries again by itself while the server is out of order', async () => {
    const sent = network([refused(503, 'Not just now.')])
    const { autosave, states } = open()
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    expect(states.at(-1)).toBe('refused')
    await vi.advanceTimersByTimeAsync(16_000)
    expect(sent).toHaveLength(2)
    expect(states.at(-1)).toBe('saved')
  })

  it('hands on what the server has after each save, for opening without the network', async () => {
    network([Response.json({ ok: true, value: { outcome: 'saved', head: version('made') } })])
    const onServer: string[] = []
    const autosave = createAutosave({
      draftId: 'draft',
      base: 'first',
      newId: () => 'made',
      keep: async () => {},
      drop: async () => {},
      onSaved: ({ id }) => onServer.push(id),
      onState: () => {},
      onConflict: () => {},
    })
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(2100)
    expect(onServer).toEqual(['made'])
    autosave.goOnFrom(version('theirs'), undefined)
    expect(onServer).toEqual(['made', 'theirs'])
  })

  it('says that a device is full, and still sends', async () => {
    const sent = network([])
    const states: SaveState['kind'][] = []
    const autosave = createAutosave({
      draftId: 'draft',
      base: 'first',
      newId: () => 'made',
      keep: () => Promise.reject(new DOMException('full', 'QuotaExceededError')),
      drop: async () => {},
      onState: (state) => states.push(state.kind),
      onConflict: () => {},
    })
    autosave.change(content(1))
    await vi.advanceTimersByTimeAsync(10)
    expect(states.at(-1)).toBe('refused')
    await vi.advanceTimersByTimeAsync(2100)
    expect(sent).toHaveLength(1)
  })
})
