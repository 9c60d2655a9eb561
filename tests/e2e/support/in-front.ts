import { createServer, request as forward } from 'node:http'
import type { AddressInfo } from 'node:net'
import { text } from 'node:stream/consumers'

/**
 * A server in front of the application, so that a test can take it away, put it back under the same address, and let it
 * seem to serve another build.
 */
export async function standInFront(appOrigin: string) {
  const app = new URL(appOrigin)
  let build: { from: string; to: string } | undefined
  const extra = new Map<string, string>()

  const server = createServer((asked, answer) => {
    const script = extra.get(asked.url ?? '')
    if (script !== undefined) {
      answer.writeHead(200, { 'content-type': 'text/javascript' }).end(script)
      return
    }
    const headers = { ...asked.headers, host: app.host, 'accept-encoding': 'identity' }
    if (headers.origin) headers.origin = app.origin
    const { hostname, port } = app
    const path = build ? asked.url?.replace(`/static/${build.to}/`, `/static/${build.from}/`) : asked.url
    const passed = forward({ hostname, port, path, method: asked.method, headers }, (got) => {
      const kind = got.headers['content-type'] ?? ''
      if (!build || !/html|json/.test(kind)) {
        answer.writeHead(got.statusCode ?? 502, got.headers)
        got.pipe(answer)
        return
      }
      const { from, to } = build
      void text(got).then((said) => {
        const { 'content-length': _, 'transfer-encoding': __, ...kept } = got.headers
        answer.writeHead(got.statusCode ?? 502, kept).end(said.replaceAll(from, to))
      })
    })
    passed.on('error', () => answer.destroy())
    asked.pipe(passed)
  })
  const listen = (port: number) => new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve))
  await listen(0)
  const { port } = server.address() as AddressInfo

  return {
    origin: `http://localhost:${port}`,
    /** Cuts every connection and takes no new one. */
    async stop() {
      const closed = new Promise((resolve) => server.close(resolve))
      server.closeAllConnections()
      await closed
    },
    start: () => listen(port),
    /** From now on the build seems to have another name. */
    rename(from: string, to: string) {
      build = { from, to }
    },
    /** Serves a script of the test's own. */
    serve(path: string, script: string) {
      extra.set(path, script)
    },
  }
}
