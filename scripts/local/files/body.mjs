import { createHash } from 'node:crypto'
import { StoreError } from './errors.mjs'

/** Checks that a body may carry, by the header (or trailer) that names it; each answers in base64. */
const checksums = {
  'x-amz-checksum-crc32': (bytes) => crc32(bytes),
  'x-amz-checksum-sha1': (bytes) => createHash('sha1').update(bytes).digest('base64'),
  'x-amz-checksum-sha256': (bytes) => createHash('sha256').update(bytes).digest('base64'),
}

/**
 * Reads the body of an upload whole and proves it against everything the request says of it.
 * @param {import('node:http').IncomingMessage} request
 * @param {string} payload what the signature says of the body, as checkSignature gives it
 * @param {number} limit most bytes an object may have
 * @returns {Promise<{ bytes: Buffer, checksum: Record<string, string> }>} checksum: the header that a reader may check by
 * @throws {StoreError} EntityTooLarge, IncompleteBody, BadDigest, XAmzContentSHA256Mismatch, NotImplemented
 */
export async function readBody(request, payload, limit) {
  const sent = await readAll(request, limit)
  const { bytes, trailers } = isChunked(request, payload)
    ? unchunked(sent, request)
    : { bytes: sent, trailers: {} }
  if (bytes.length > limit) throw tooLarge(limit)
  if (/^[0-9a-f]{64}$/.test(payload) && createHash('sha256').update(bytes).digest('hex') !== payload)
    throw new StoreError('XAmzContentSHA256Mismatch', 'The body is not the one that was signed.')
  const md5 = request.headers['content-md5']
  if (md5 && createHash('md5').update(bytes).digest('base64') !== md5)
    throw new StoreError('BadDigest', 'The body does not have the Content-MD5 that was sent.')
  return { bytes, checksum: checked(bytes, { ...request.headers, ...trailers }) }
}

async function readAll(request, limit) {
  const parts = []
  let size = 0
  // What is too large is read to its end all the same: a client that is cut off would not see the answer.
  for await (const part of request) {
    size += part.length
    // The frames around the parts of a chunked body weigh little.
    if (size <= limit * 1.1 + 65_536) parts.push(part)
  }
  if (size > limit * 1.1 + 65_536) throw tooLarge(limit)
  return Buffer.concat(parts)
}

const tooLarge = (limit) => new StoreError('EntityTooLarge', `An object has at most ${limit} bytes.`)

function isChunked(request, payload) {
  if (payload === 'STREAMING-UNSIGNED-PAYLOAD-TRAILER') return true
  if (payload.startsWith('STREAMING-'))
    throw new StoreError('NotImplemented', 'Bodies whose chunks are signed one by one are not taken here.')
  return /\baws-chunked\b/.test(request.headers['content-encoding'] ?? '')
}

/** Takes the frames off an aws-chunked body: `size in hex CRLF bytes CRLF` …, `0 CRLF`, trailers, an empty line. */
function unchunked(sent, request) {
  const incomplete = () =>
    new StoreError('IncompleteBody', 'The chunks of the body do not add up to what was announced.')
  const parts = []
  let at = 0
  const line = () => {
    const end = sent.indexOf('\r\n', at)
    if (end < 0) throw incomplete()
    const text = sent.toString('latin1', at, end)
    at = end + 2
    return text
  }
  for (;;) {
    const size = /^[0-9a-f]{1,8}(?=;|$)/i.exec(line())?.[0]
    if (size === undefined) throw incomplete()
    const length = Number.parseInt(size, 16)
    if (length === 0) break
    if (at + length + 2 > sent.length) throw incomplete()
    parts.push(sent.subarray(at, at + length))
    at += length
    if (line() !== '') throw incomplete()
  }
  const trailers = {}
  while (at < sent.length) {
    const [name, ...value] = line().split(':')
    if (name !== '') trailers[name.trim().toLowerCase()] = value.join(':').trim()
  }
  const bytes = Buffer.concat(parts)
  const announced = request.headers['x-amz-decoded-content-length']
  if (announced !== undefined && Number(announced) !== bytes.length) throw incomplete()
  const promised = request.headers['x-amz-trailer']
  if (promised && trailers[promised.toLowerCase()] === undefined) throw incomplete()
  return { bytes, trailers }
}

function checked(bytes, fields) {
  const name = Object.keys(fields).find(
    (each) => /^x-amz-checksum-(crc|sha)/.test(each) && typeof fields[each] === 'string',
  )
  if (!name) return {}
  const make = checksums[name]
  if (!make)
    throw new StoreError('NotImplemented', `Of the checksums there are ${Object.keys(checksums).join(', ')}.`)
  if (make(bytes) !== fields[name])
    throw new StoreError('BadDigest', `The body does not have the ${name} that was sent.`)
  return { [name]: fields[name] }
}

const table = Uint32Array.from({ length: 256 }, (_, byte) => {
  let value = byte
  for (let bit = 0; bit < 8; bit++) value = value & 1 ? (value >>> 1) ^ 0xedb88320 : value >>> 1
  return value
})

/** CRC-32 (ISO 3309), its four bytes in base64. */
function crc32(bytes) {
  let value = 0xffffffff
  for (const byte of bytes) value = (value >>> 8) ^ table[(value ^ byte) & 255]
  const result = Buffer.alloc(4)
  result.writeUInt32BE((value ^ 0xffffffff) >>> 0)
  return result.toString('base64')
}
