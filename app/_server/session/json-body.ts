import 'server-only'
import { AccessError } from '@/db/access-error'

const limit = 1024 * 1024

/** The JSON object of a request, at most 1 MB. @throws AccessError invalid */
export async function jsonBody(request: Request): Promise<Record<string, unknown>> {
  const refuse = (message: string) => new AccessError('invalid', message)
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? ''))
    throw refuse('Send JSON, with the content type application/json.')
  const chunks: Uint8Array[] = []
  let size = 0
  const reader = request.body?.getReader()
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    size += part.value.byteLength
    if (size > limit) throw refuse('This is more than 1 MB, which no draft or card needs.')
    chunks.push(part.value)
  }
  try {
    const value: unknown = JSON.parse(Buffer.concat(chunks).toString('utf8'))
    if (value !== null && typeof value === 'object' && !Array.isArray(value))
      return value as Record<string, unknown>
  } catch {
    throw refuse('This is not JSON.')
  }
  throw refuse('Send one JSON object.')
}
