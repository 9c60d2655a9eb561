import { join } from 'node:path'
import { listenHttp } from '../http.mjs'
import { portLike } from '../ports.mjs'
import { answer } from './answer.mjs'
import { StoreError } from './errors.mjs'
import { filesPage } from './page.mjs'
import { openStore } from './store.mjs'
import { errorXml } from './xml.mjs'

/** Most bytes of one object: more than a photograph or a pattern ever has. */
const limit = 50 * 1024 * 1024

/**
 * A local stand-in for an object store: speaks enough of the S3 protocol for its client library, to whoever signs with
 * its key, and lists what it holds on a page (`/`).
 * @param {object} options
 * @param {string} options.folder data folder of the installation; objects stand in `files` inside
 * @param {{ port?: number }} options.remembered
 * @param {import('./signature.mjs').Keys} options.keys
 * @param {string} options.bucket
 * @returns {Promise<{ endpoint: string, ports: { port: number }, stop: () => Promise<void> }>}
 */
export async function startFiles({ folder, remembered, keys, bucket }) {
  const store = openStore(join(folder, 'files'))
  const port = await portLike(remembered.port)
  const server = await listenHttp(port, async (request, response) => {
    if (request.method === 'GET' && request.url === '/' && !request.headers.authorization)
      return filesPage(response, store.list())
    try {
      const { status, headers, body } = await answer(request, { store, keys, bucket, limit })
      response.writeHead(status, headers).end(request.method === 'HEAD' ? undefined : body)
    } catch (error) {
      if (!(error instanceof StoreError)) throw error
      request.resume()
      const body = request.method === 'HEAD' ? undefined : errorXml(error, request.url.split('?')[0])
      response.writeHead(error.status, { 'content-type': 'application/xml' }).end(body)
    }
  })
  return { endpoint: `http://127.0.0.1:${port}`, ports: { port }, stop: server.stop }
}
