import { type NextRequest, NextResponse } from 'next/server'

const production = process.env.NODE_ENV === 'production'

/** React's development build evaluates code to explain errors; nothing else may. */
const evaluation = production ? '' : " 'unsafe-eval'"

function contentPolicy(nonce: string): string {
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${evaluation}`,
    // Positions on the sheet are style attributes; style elements need the nonce.
    production ? `style-src 'self' 'nonce-${nonce}'` : "style-src 'self' 'unsafe-inline'",
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self'",
    "manifest-src 'self'",
    "form-action 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
  ].join('; ')
}

/** Pages that anyone may see and that hold nothing of anybody: the rest must not be kept by a cache. */
const publicPages = /^\/(?:$|about|legal|terms|privacy)/

/** Pages opened by a link with a secret in it, which no other page may learn. */
const secretLinks = /^\/(?:s|api\/shared|reset|invitation|join)(?:\/|$)/

/**
 * Headers of every page and answer. They are a second line: sessions, permissions and origins are checked where the
 * work is done.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = btoa(crypto.randomUUID())
  const policy = contentPolicy(nonce)
  const headers = new Headers(request.headers)
  headers.set('x-nonce', nonce)
  headers.set('content-security-policy', policy)
  // For the way back after signing in.
  headers.set('x-page', `${request.nextUrl.pathname}${request.nextUrl.search}`)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('content-security-policy', policy)
  response.headers.set('x-content-type-options', 'nosniff')
  response.headers.set('cross-origin-opener-policy', 'same-origin')
  response.headers.set('permissions-policy', 'camera=(), geolocation=(), microphone=()')
  response.headers.set(
    'referrer-policy',
    secretLinks.test(request.nextUrl.pathname) ? 'no-referrer' : 'same-origin',
  )
  if (process.env.CHALKFOLD_ENV === 'production')
    response.headers.set('strict-transport-security', 'max-age=63072000; includeSubDomains')
  if (!publicPages.test(request.nextUrl.pathname)) response.headers.set('cache-control', 'private, no-store')
  return response
}

/** Built files are the same for everybody and may be kept. */
export const config = { matcher: '/((?!_next/static|_next/image|fonts/|icons/|favicon.ico).*)' }
