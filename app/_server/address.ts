import 'server-only'
import { subscribe } from 'node:diagnostics_channel'
import type { IncomingMessage } from 'node:http'

/** How many proxies of ours stand in front of this server. */
const proxies = () => Number(process.env.TRUSTED_PROXIES ?? 0)

/**
 * Where a request came from, for the limits: the entry that the outermost of our own proxies wrote.
 * @returns an IP address, or 'unknown'
 */
export function requestAddress(headers: Headers): string {
  const hops = (headers.get('x-forwarded-for') ?? '').split(',').map((hop) => hop.trim())
  return hops.at(-Math.max(1, proxies())) || 'unknown'
}

/** Without a proxy of ours in front, what a visitor claims about the address is dropped and the socket's stands. */
export function dropClaimedAddresses(): void {
  subscribe('http.server.request.start', (message) => {
    if (proxies() > 0) return
    const { request } = message as { request: IncomingMessage }
    delete request.headers['x-forwarded-for']
  })
}
