import { readdirSync, mkdtempSync, rmSync } from 'node:fs'
import { request as httpRequest } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Readable } from 'node:stream'
import { text } from 'node:stream/consumers'
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  ListObjectsV2Command,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3'
import { getSignedUrl } from '@aws-sdk/s3-request-presigner'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startFiles } from '../../scripts/local/files/start.mjs'

const keys = { accessKey: 'workroom', secretKey: 'linen-thread-and-a-long-needle', region: 'local' }
const bucket = 'photographs'
const folder = mkdtempSync(join(tmpdir(), 'chalkfold-files-'))
let endpoint: string
let stop: () => Promise<void>

beforeAll(async () => {
  ;({ endpoint, stop } = await startFiles({ folder, remembered: {}, keys, bucket }))
})
afterAll(async () => {
  await stop()
  rmSync(folder, { recursive: true, force: true })
})

function clientWith(changes: Partial<typeof keys> = {}) {
  const { accessKey, secretKey, region } = { ...keys, ...changes }
  const credentials = { accessKeyId: accessKey, secretAccessKey: secretKey }
  return new S3Client({ endpoint, region, credentials, forcePathStyle: true, maxAttempts: 1 })
}
const put = (Key: string, Body: string | Uint8Array, more = {}) =>
  clientWith().send(new PutObjectCommand({ Bucket: bucket, Key, Body, ...more }))
const get = (Key: string) => clientWith().send(new GetObjectCommand({ Bucket: bucket, Key }))
const named = (name: string) => expect.objectContaining({ name })

describe('the local store of files, asked by the client library', () => {
  it('keeps bytes, kind and notes, and gives them back unchanged', async () => {
    const bytes = Uint8Array.from({ length: 100_000 }, (_, index) => (index * 31) % 256)
    const sent = await put('cards/één foto (2).jpg', bytes, {
      ContentType: 'image/jpeg',
      CacheControl: 'private, max-age=60',
      Metadata: { width: '640', taken: 'in daylight' },
    })
    const got = await get('cards/één foto (2).jpg')
    expect(await got.Body?.transformToByteArray()).toEqual(bytes)
    expect(got).toMatchObject({
      ContentType: 'image/jpeg',
      CacheControl: 'private, max-age=60',
      ContentLength: 100_000,
      ETag: sent.ETag,
      Metadata: { width: '640', taken: 'in daylight' },
    })
  })

  it('takes a stream, whose checksum follows after its chunks', async () => {
    const parts = ['one ', 'two ', 'three'.repeat(30_000)]
    const Body = Readable.from(parts.map((part) => Buffer.from(part)))
    await put('stream.txt', Body as unknown as Uint8Array, { ContentLength: parts.join('').length })
    const got = await get('stream.txt')
    expect(await got.Body?.transformToString()).toBe(parts.join(''))
    expect(got.ContentEncoding).toBeUndefined()
  })

  it('describes an object without sending it, and forgets one that is deleted', async () => {
    await put('brief.txt', 'here')
    const asked = { Bucket: bucket, Key: 'brief.txt' }
    expect(await clientWith().send(new HeadObjectCommand(asked))).toMatchObject({ ContentLength: 4 })
    await clientWith().send(new DeleteObjectCommand(asked))
    await clientWith().send(new DeleteObjectCommand(asked))
    await expect(get('brief.txt')).rejects.toEqual(named('NoSuchKey'))
    await expect(clientWith().send(new HeadObjectCommand(asked))).rejects.toEqual(named('NotFound'))
  })

  it('lists by prefix, page by page, in the order of the keys', async () => {
    for (const key of ['list/c', 'list/a', 'list/b', 'other']) await put(key, key)
    const page = (ContinuationToken?: string) =>
      clientWith().send(
        new ListObjectsV2Command({ Bucket: bucket, Prefix: 'list/', MaxKeys: 2, ContinuationToken }),
      )
    const first = await page()
    const second = await page(first.NextContinuationToken)
    expect(first.Contents?.map(({ Key, Size }) => [Key, Size])).toEqual([
      ['list/a', 6],
      ['list/b', 6],
    ])
    expect([first.IsTruncated, second.IsTruncated]).toEqual([true, false])
    expect(second.Contents?.map(({ Key }) => Key)).toEqual(['list/c'])
  })

  it('does not write over an object that must be new', async () => {
    await put('once.txt', 'first', { IfNoneMatch: '*' })
    await expect(put('once.txt', 'second', { IfNoneMatch: '*' })).rejects.toEqual(named('PreconditionFailed'))
    expect(await (await get('once.txt')).Body?.transformToString()).toBe('first')
  })

  it('keeps whatever a key says inside its folder, under that key alone', async () => {
    for (const key of [
      '../../escape',
      '/etc/passwd',
      'a/../b',
      '..\\..\\b',
      'a%2e%2e/b',
      ' ',
      'line\nbreak',
      '🪡',
    ])
      await put(key, `kept as ${key}`)
    for (const key of ['../../escape', 'a/../b', 'line\nbreak', '🪡'])
      expect(await (await get(key)).Body?.transformToString()).toBe(`kept as ${key}`)
    await expect(get('b')).rejects.toEqual(named('NoSuchKey'))
    expect(readdirSync(folder)).toEqual(['files'])
    expect(readdirSync(join(folder, 'files')).every((name) => /^[0-9a-f]{64}\.object$/.test(name))).toBe(true)
  })

  it('refuses other keys, another region and another bucket, each by the name that the library knows', async () => {
    const ask = (client: S3Client, Bucket = bucket) =>
      client.send(new GetObjectCommand({ Bucket, Key: 'other' }))
    const refusals = {
      InvalidAccessKeyId: () => ask(clientWith({ accessKey: 'somebody' })),
      SignatureDoesNotMatch: () => ask(clientWith({ secretKey: 'another' })),
      AccessDenied: () => ask(clientWith({ region: 'elsewhere' })),
      NoSuchBucket: () => ask(clientWith(), 'elsewhere'),
    }
    for (const [name, asked] of Object.entries(refusals)) await expect(asked()).rejects.toEqual(named(name))
    await expect(clientWith().send(new HeadBucketCommand({ Bucket: bucket }))).resolves.toBeDefined()
    await expect(clientWith().send(new HeadBucketCommand({ Bucket: 'elsewhere' }))).rejects.toEqual(
      named('NotFound'),
    )
  })

  it('refuses a clock that is far off', async () => {
    const late = new S3Client({
      endpoint,
      region: keys.region,
      credentials: { accessKeyId: keys.accessKey, secretAccessKey: keys.secretKey },
      forcePathStyle: true,
      maxAttempts: 1,
      systemClockOffset: 20 * 60_000,
    })
    const asked = late.send(new GetObjectCommand({ Bucket: bucket, Key: 'other' }))
    await expect(asked).rejects.toEqual(named('RequestTimeTooSkewed'))
  })

  it('refuses an object that is too large, and is there afterwards', async () => {
    await expect(put('huge', new Uint8Array(50 * 1024 * 1024 + 1))).rejects.toEqual(named('EntityTooLarge'))
    await expect(get('huge')).rejects.toEqual(named('NoSuchKey'))
  })

  it('says what it cannot do instead of doing half of it', async () => {
    const asked = clientWith().send(
      new GetObjectCommand({ Bucket: bucket, Key: 'other', Range: 'bytes=0-1' }),
    )
    await expect(asked).rejects.toEqual(named('NotImplemented'))
  })
})

/** A request as the library signs it, altered on its way. */
async function altered(change: (sent: { headers: Record<string, string>; body: Buffer }) => void) {
  let status = 0
  let answer = ''
  const client = clientWith()
  client.middlewareStack.add(
    () => async (args) => {
      const { method, path, query, headers, body } = args.request as {
        method: string
        path: string
        query: Record<string, string>
        headers: Record<string, string>
        body: Uint8Array
      }
      const sent = { headers: { ...headers }, body: Buffer.from(body) }
      change(sent)
      ;[status, answer] = await new Promise<[number, string]>((resolve, reject) => {
        const request = httpRequest(
          `${endpoint}${path}?${new URLSearchParams(query)}`,
          { method, headers: sent.headers },
          (response) => {
            void text(response).then((said) => resolve([response.statusCode ?? 0, said]), reject)
          },
        )
        request.on('error', reject).end(sent.body)
      })
      throw new Error('sent in its place')
    },
    { step: 'finalizeRequest', priority: 'low' },
  )
  await client
    .send(new PutObjectCommand({ Bucket: bucket, Key: 'altered', Body: 'twelve bytes' }))
    .catch(() => undefined)
  return { status, code: /<Code>(.*)<\/Code>/.exec(answer)?.[1] }
}

describe('a signed address', () => {
  const signed = (key: string, more = {}, expiresIn = 60) =>
    getSignedUrl(clientWith(), new GetObjectCommand({ Bucket: bucket, Key: key, ...more }), { expiresIn })

  it('opens one object, as the kind of file that it was signed for', async () => {
    await put('signed/a b.txt', 'for whoever has the address')
    const more = { ResponseContentType: 'text/x-note', ResponseContentDisposition: 'attachment' }
    const answer = await fetch(await signed('signed/a b.txt', more))
    expect(await answer.text()).toBe('for whoever has the address')
    expect(answer.headers.get('content-type')).toBe('text/x-note')
    expect(answer.headers.get('content-disposition')).toBe('attachment')
  })

  it('takes an upload', async () => {
    const command = new PutObjectCommand({ Bucket: bucket, Key: 'signed/up.txt' })
    const address = await getSignedUrl(clientWith(), command, { expiresIn: 60 })
    expect((await fetch(address, { method: 'PUT', body: 'brought here' })).status).toBe(200)
    expect(await (await get('signed/up.txt')).Body?.transformToString()).toBe('brought here')
  })

  it('opens nothing else, nothing longer, and nothing to another method', async () => {
    const address = await signed('signed/a b.txt')
    const past = new Date(Date.now() - 61_000)
    const old = await getSignedUrl(clientWith(), new GetObjectCommand({ Bucket: bucket, Key: 'other' }), {
      expiresIn: 60,
      signingDate: past,
    })
    const statuses = [
      await fetch(address.replace('a%20b', 'up')),
      await fetch(address.replace('X-Amz-Expires=60', 'X-Amz-Expires=6000')),
      await fetch(address, { method: 'DELETE' }),
      await fetch(old),
    ].map(({ status }) => status)
    expect(statuses).toEqual([403, 403, 403, 403])
  })
})

describe('a signed request', () => {
  it('is taken as it was signed', async () => {
    expect(await altered(() => undefined)).toEqual({ status: 200, code: undefined })
  })

  it('is refused with another body, another header, another checksum or no signature', async () => {
    const refusals = [
      await altered((sent) => (sent.body = Buffer.from('other  bytes'))),
      await altered((sent) => (sent.headers['x-amz-date'] = '20200101T000000Z')),
      await altered((sent) => (sent.headers['x-amz-checksum-crc32'] = 'AAAAAA==')),
      await altered((sent) => delete sent.headers.authorization),
    ]
    expect(refusals.map(({ code }) => code)).toEqual([
      'XAmzContentSHA256Mismatch',
      'AccessDenied',
      'SignatureDoesNotMatch',
      'AccessDenied',
    ])
  })

  it('is nothing a browser can be made to send: the page lists names only', async () => {
    await put('secret <b>.txt', 'nobody reads this')
    const page = await (await fetch(`${endpoint}/`)).text()
    expect(page).toContain('secret &#60;b&#62;.txt')
    expect(page).not.toContain('nobody reads this')
    expect((await fetch(`${endpoint}/${bucket}/other`)).status).toBe(403)
    const elsewhere = await new Promise<number>((resolve) => {
      httpRequest(`${endpoint}/`, { headers: { host: 'evil.example' } }, (response) => {
        response.resume()
        resolve(response.statusCode ?? 0)
      }).end()
    })
    expect(elsewhere).toBe(421)
  })
})
