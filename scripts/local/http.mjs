import { createServer } from 'node:http'

/**
 * A small HTTP server on the loopback address. It answers only when it is addressed as such: a page of some other site
 * must not reach it by letting its own name point here.
 * @param {number} port
 * @param {import('node:http').RequestListener} answer
 * @returns {Promise<{ stop: () => Promise<void> }>}
 */
export async function listenHttp(port, answer) {
  const names = new Set([`127.0.0.1:${port}`, `localhost:${port}`])
  const server = createServer(async (request, response) => {
    if (!names.has(request.headers.host ?? '')) return response.writeHead(421).end()
    try {
      await answer(request, response)
    } catch (error) {
      response.writeHead(500, { 'content-type': 'text/plain' }).end(error.message)
    }
  })
  await new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', resolve)
  })
  return {
    stop: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}
