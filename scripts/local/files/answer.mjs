import { readBody } from './body.mjs'
import { StoreError } from './errors.mjs'
import { checkSignature } from './signature.mjs'
import { listXml } from './xml.mjs'

/** Headers of an upload that come back with the object. */
const keptHeaders = ['content-type', 'content-language', 'content-disposition', 'cache-control', 'expires']
/** Most characters in the names and values of what an uploader notes on an object. */
const longestNotes = 2048

/**
 * @typedef {object} Answer
 * @property {number} status
 * @property {Record<string, string | number>} [headers]
 * @property {Buffer | string} [body]
 */

/**
 * Answers one request of the object protocol: put, get, head and delete an object, list them, ask for the bucket.
 * @param {import('node:http').IncomingMessage} request
 * @param {{ store: ReturnType<import('./store.mjs').openStore>, keys: import('./signature.mjs').Keys, bucket: string, limit: number }} options
 * @returns {Promise<Answer>}
 * @throws {StoreError}
 */
export async function answer(request, { store, keys, bucket, limit }) {
  const payload = checkSignature(request, keys)
  const [path, query = ''] = request.url.split('?')
  const asked = new URLSearchParams(query)
  const [name, ...rest] = path.slice(1).split('/').map(decodeURIComponent)
  if (name !== bucket) throw new StoreError('NoSuchBucket', `There is one bucket here: ${bucket}.`)
  const key = rest.join('/')
  if (Buffer.byteLength(key) > 1024) throw new StoreError('KeyTooLongError', 'A key has at most 1024 bytes.')
  refuseOthers(request, asked)

  if (key === '') return answerBucket(request, asked, { store, bucket })
  switch (request.method) {
    case 'PUT':
      return put(request, key, await readBody(request, payload, limit), store)
    case 'GET':
    case 'HEAD':
      return get(key, asked, store)
    case 'DELETE':
      store.remove(key)
      return { status: 204 }
    default:
      throw new StoreError('MethodNotAllowed', 'Objects are put, got and deleted.')
  }
}

/** What this store does not do it says, rather than doing half of it. */
function refuseOthers(request, asked) {
  const words = [
    'acl',
    'tagging',
    'uploads',
    'uploadId',
    'versionId',
    'versions',
    'delete',
    'delimiter',
    'policy',
  ]
  const word = words.find((each) => asked.has(each))
  const header = ['x-amz-copy-source', 'range', 'if-match'].find(
    (each) => request.headers[each] !== undefined,
  )
  if (word ?? header)
    throw new StoreError('NotImplemented', `The local store does not know ${word ?? header}.`)
}

function put(request, key, { bytes, checksum }, store) {
  if (request.headers['if-none-match'] === '*' && store.read(key))
    throw new StoreError('PreconditionFailed', 'There is an object under this key already.')
  const notes = Object.entries(request.headers).filter(([name]) => name.startsWith('x-amz-meta-'))
  if (notes.flat().join('').length > longestNotes)
    throw new StoreError('MetadataTooLarge', `Notes on an object have at most ${longestNotes} characters.`)
  const headers = { 'content-type': 'application/octet-stream', ...checksum, ...Object.fromEntries(notes) }
  for (const name of keptHeaders) if (request.headers[name]) headers[name] = request.headers[name]
  const coding = (request.headers['content-encoding'] ?? '')
    .split(',')
    .map((each) => each.trim())
    .filter((each) => each !== '' && each !== 'aws-chunked')
  if (coding.length > 0) headers['content-encoding'] = coding.join(', ')
  const { etag } = store.write(key, bytes, headers)
  return { status: 200, headers: { etag: `"${etag}"`, ...checksum } }
}

function get(key, asked, store) {
  const found = store.read(key)
  if (!found) throw new StoreError('NoSuchKey', 'The specified key does not exist.')
  const { kept, bytes } = found
  const headers = {
    ...kept.headers,
    etag: `"${kept.etag}"`,
    'last-modified': new Date(kept.modified).toUTCString(),
    'content-length': bytes.length,
  }
  for (const name of ['content-type', 'content-disposition', 'cache-control'])
    if (asked.has(`response-${name}`)) headers[name] = asked.get(`response-${name}`)
  return { status: 200, headers, body: bytes }
}

function answerBucket(request, asked, { store, bucket }) {
  if (request.method === 'HEAD') return { status: 200 }
  if (request.method !== 'GET' || asked.get('list-type') !== '2')
    throw new StoreError('NotImplemented', 'The bucket is there already; of lists there is list-type=2.')
  const prefix = asked.get('prefix') ?? ''
  const token = asked.get('continuation-token')
  const after = token === null ? asked.get('start-after') : Buffer.from(token, 'base64url').toString()
  const most = Math.min(Number(asked.get('max-keys') ?? 1000), 1000)
  if (!Number.isInteger(most) || most < 0)
    throw new StoreError('InvalidArgument', 'max-keys is a whole number from 0 to 1000.')
  const bytesOf = (text) => Buffer.from(text)
  const all = store
    .list()
    .filter(({ key }) => key.startsWith(prefix))
    .filter(({ key }) => !after || Buffer.compare(bytesOf(key), bytesOf(after)) > 0)
  const page = all.slice(0, most)
  const last = page.at(-1)
  const next = last && all.length > page.length ? bytesOf(last.key).toString('base64url') : undefined
  const body = listXml({ bucket, prefix, most, page, next })
  return { status: 200, headers: { 'content-type': 'application/xml' }, body }
}
