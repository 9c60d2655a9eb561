import { createHash, createHmac, timingSafeEqual } from 'node:crypto'
import { StoreError } from './errors.mjs'

const algorithm = 'AWS4-HMAC-SHA256'
/** How far a request's clock may differ from ours, and how long an address may be signed for: milliseconds, seconds. */
const skew = 15 * 60_000
const longest = 7 * 24 * 3600

/**
 * @typedef {object} Keys
 * @property {string} accessKey
 * @property {string} secretKey
 * @property {string} region
 */

/**
 * Checks the signature (version 4) of a request, in its header or in its address.
 * @param {import('node:http').IncomingMessage} request
 * @param {Keys} keys
 * @param {Date} now
 * @returns {string} what the signature says of the body: its SHA-256 in hex, or a word such as UNSIGNED-PAYLOAD
 * @throws {StoreError} AccessDenied, InvalidAccessKeyId, RequestTimeTooSkewed, SignatureDoesNotMatch
 */
export function checkSignature(request, keys, now = new Date()) {
  const [path, query = ''] = request.url.split('?')
  const pairs = queryPairs(query)
  const given = request.headers.authorization ? fromHeader(request.headers) : fromAddress(new Map(pairs), now)
  const [accessKey, day, region, service, end] = given.credential.split('/')
  if (accessKey !== keys.accessKey)
    throw new StoreError('InvalidAccessKeyId', 'There is no access key of this name: see FILES_ACCESS_KEY.')
  if (region !== keys.region || service !== 's3' || end !== 'aws4_request' || day !== given.date.slice(0, 8))
    throw new StoreError('AccessDenied', `Sign for this day, the region ${keys.region} and the service s3.`)
  if (Math.abs(now.getTime() - timeOf(given.date)) > (given.lasts ?? skew))
    throw new StoreError('RequestTimeTooSkewed', 'The time of the signature is too far from now.')
  if (!given.signedHeaders.includes('host'))
    throw new StoreError('AccessDenied', 'The host must be among the signed headers.')

  const canonical = [
    request.method,
    path,
    pairs
      .filter(([name]) => name !== 'X-Amz-Signature')
      .map(([name, value]) => `${encoded(name)}=${encoded(value)}`)
      .sort()
      .join('&'),
    ...given.signedHeaders.map((name) => `${name}:${headerText(request.headers[name])}`),
    '',
    given.signedHeaders.join(';'),
    given.payload,
  ].join('\n')
  const scope = `${day}/${region}/${service}/${end}`
  const text = [algorithm, given.date, scope, sha256(canonical)].join('\n')
  const key = [day, region, service, end].reduce(hmac, `AWS4${keys.secretKey}`)
  if (!same(hmac(key, text).toString('hex'), given.signature))
    throw new StoreError('SignatureDoesNotMatch', 'The signature is not the one of this request and key.')
  return given.payload
}

function fromHeader(headers) {
  const found =
    /^AWS4-HMAC-SHA256 Credential=([^,\s]+),\s*SignedHeaders=([^,\s]+),\s*Signature=([0-9a-f]{64})$/.exec(
      headers.authorization,
    )
  if (!found) throw new StoreError('AccessDenied', `Sign with ${algorithm}.`)
  const payload = headers['x-amz-content-sha256']
  if (typeof payload !== 'string')
    throw new StoreError('AccessDenied', 'The header x-amz-content-sha256 is missing.')
  const [, credential, signed, signature] = found
  const date = dateText(headers['x-amz-date'])
  return { credential, signature, date, payload, lasts: undefined, signedHeaders: signed.split(';') }
}

function fromAddress(query, now) {
  if (query.get('X-Amz-Algorithm') !== algorithm)
    throw new StoreError('AccessDenied', `This store answers signed requests only: sign with ${algorithm}.`)
  const date = dateText(query.get('X-Amz-Date'))
  const seconds = Number(query.get('X-Amz-Expires'))
  if (!Number.isInteger(seconds) || seconds < 1 || seconds > longest)
    throw new StoreError('AccessDenied', `X-Amz-Expires is a number of seconds from 1 to ${longest}.`)
  if (now.getTime() > timeOf(date) + seconds * 1000)
    throw new StoreError('AccessDenied', 'Request has expired')
  return {
    credential: query.get('X-Amz-Credential') ?? '',
    signature: query.get('X-Amz-Signature') ?? '',
    signedHeaders: (query.get('X-Amz-SignedHeaders') ?? '').split(';'),
    date,
    payload: query.get('X-Amz-Content-Sha256') ?? 'UNSIGNED-PAYLOAD',
    lasts: Math.max(skew, seconds * 1000),
  }
}

/** @returns {[string, string][]} the query's names and values, decoded */
function queryPairs(query) {
  return query
    .split('&')
    .filter(Boolean)
    .map((pair) => {
      const [name, ...value] = pair.split('=')
      return [decoded(name), decoded(value.join('='))]
    })
}

function decoded(text) {
  try {
    return decodeURIComponent(text)
  } catch {
    throw new StoreError('InvalidArgument', 'The address is not encoded as an address is.')
  }
}

const encoded = (text) =>
  encodeURIComponent(text).replace(/[!'()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`)

const headerText = (value) => [value].flat().join(',').trim().replace(/\s+/g, ' ')

function dateText(text) {
  if (typeof text === 'string' && /^\d{8}T\d{6}Z$/.test(text)) return text
  throw new StoreError('AccessDenied', 'The date of the signature is missing: 20260131T120000Z.')
}

const timeOf = (date) => Date.parse(date.replace(/^(....)(..)(..)T(..)(..)(..)Z$/, '$1-$2-$3T$4:$5:$6Z'))

const sha256 = (text) => createHash('sha256').update(text).digest('hex')
const hmac = (key, text) => createHmac('sha256', key).update(text).digest()

function same(one, other) {
  return one.length === other.length && timingSafeEqual(Buffer.from(one), Buffer.from(other))
}
