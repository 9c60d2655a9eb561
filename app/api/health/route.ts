import { databaseAnswers } from '@/db/access/health'

export const dynamic = 'force-dynamic'

/** For whoever watches the server: 200 when it and its database answer, 503 otherwise. Says nothing else. */
export async function GET(): Promise<Response> {
  const up = await databaseAnswers()
  return Response.json({ ok: up }, { status: up ? 200 : 503, headers: { 'cache-control': 'no-store' } })
}
