import { buildId, builtFiles } from '@/app/_server/build'

export const dynamic = 'force-dynamic'

/** What a device keeps of the present build to open without the network: files alone, nothing of anybody. */
export function GET(): Response {
  const headers = { 'cache-control': 'no-store' }
  if (buildId === null) return Response.json({ ok: false }, { status: 404, headers })
  return Response.json({ build: buildId, files: builtFiles() }, { headers })
}
