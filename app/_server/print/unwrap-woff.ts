import 'server-only'
import { inflateSync } from 'node:zlib'

const headerLength = 44
const entryLength = 20

/**
 * The plain font inside a WOFF 1 file (W3C recommendation, 2012): its tables inflated, under an sfnt directory. The font library
 * inflates a table afresh for every glyph that it reads from a WOFF; read from the plain font a pattern takes half the time.
 *
 * @throws Error when the bytes are not WOFF 1.
 */
export function unwrapWoff(bytes: Uint8Array): Uint8Array {
  const woff = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  if (woff.getUint32(0) !== 0x774f4646) throw new Error('Expected a WOFF 1 font file (signature "wOFF").')
  const count = woff.getUint16(12)
  const tables = Array.from({ length: count }, (_, index) =>
    readTable(bytes, woff, headerLength + index * entryLength),
  )
  const length = tables.reduce((sum, table) => sum + padded(table.data.length), 12 + count * 16)
  const font = new Uint8Array(length)
  const out = new DataView(font.buffer)
  const power = 2 ** Math.floor(Math.log2(count))
  out.setUint32(0, woff.getUint32(4))
  out.setUint16(4, count)
  out.setUint16(6, power * 16)
  out.setUint16(8, Math.log2(power))
  out.setUint16(10, (count - power) * 16)
  let offset = 12 + count * 16
  tables.forEach((table, index) => {
    const entry = 12 + index * 16
    out.setUint32(entry, table.tag)
    out.setUint32(entry + 4, table.checksum)
    out.setUint32(entry + 8, offset)
    out.setUint32(entry + 12, table.data.length)
    font.set(table.data, offset)
    offset += padded(table.data.length)
  })
  return font
}

/** Tables begin on multiples of four bytes. */
const padded = (length: number) => Math.ceil(length / 4) * 4

function readTable(bytes: Uint8Array, woff: DataView, entry: number) {
  const offset = woff.getUint32(entry + 4)
  const stored = woff.getUint32(entry + 8)
  const original = woff.getUint32(entry + 12)
  const data = bytes.subarray(offset, offset + stored)
  return {
    tag: woff.getUint32(entry),
    checksum: woff.getUint32(entry + 16),
    // A table that would not shrink is stored as it is.
    data: stored < original ? inflateSync(data) : data,
  }
}
