import { createServer } from 'node:net'

/** A port of the loopback address that nobody listens on now. */
export function freePort() {
  return new Promise((resolve, reject) => {
    const server = createServer()
    server.on('error', reject)
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address()
      server.close(() => resolve(port))
    })
  })
}

/** Whether this port can be listened on, on this address. */
export function isFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = createServer()
    server.on('error', () => resolve(false))
    server.listen(port, host, () => server.close(() => resolve(true)))
  })
}

/** The wanted port when it is free, else the next free one above it. */
export async function portFrom(wanted, host) {
  for (let port = wanted; port < Math.min(wanted + 50, 65536); port++)
    if (await isFree(port, host)) return port
  return freePort()
}

/** The port of the time before when it is still free, else another. */
export async function portLike(remembered) {
  return remembered && (await isFree(remembered)) ? remembered : freePort()
}
