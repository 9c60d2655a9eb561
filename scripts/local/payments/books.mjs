import { randomBytes } from 'node:crypto'
import { join } from 'node:path'
import { readJson, writeJson } from '../json-file.mjs'
import { missing, wrong } from './errors.mjs'

/** Kinds of things, by the letters their ids begin with, with the words of "no such …". */
const kinds = {
  cs_test: 'checkout.session',
  pi: 'payment_intent',
  ch: 'charge',
  re: 'refund',
  evt: 'event',
}

/** Fields that hold an id and can be asked for as the thing itself. */
const expandable = ['payment_intent', 'latest_charge', 'charge']

/**
 * Everything the local payment service knows, kept in one file.
 * @param {string} folder
 */
export function openBooks(folder) {
  const path = join(folder, 'books.json')
  const kept = { things: {}, lines: {}, deliveries: [], replies: {}, ...readJson(path) }

  const things = (kind) => Object.values(kept.things).filter((thing) => thing.object === kind)

  function find(prefix, id, param) {
    const thing = kept.things[id]
    if (thing?.object !== kinds[prefix]) throw missing(kinds[prefix], id, param)
    return thing
  }

  function expand(thing, [field, ...rest]) {
    if (!(field in thing) || !expandable.includes(field))
      throw wrong('expand', `This property cannot be expanded (${field}).`)
    const inner = typeof thing[field] === 'string' ? kept.things[thing[field]] : thing[field]
    if (!inner) return thing
    return { ...thing, [field]: rest.length > 0 ? expand(inner, rest) : inner }
  }

  return {
    kept,
    find,
    save: () => writeJson(path, kept),

    /** Makes a thing with an id of its own. */
    make(prefix, fields) {
      const id = `${prefix}_${randomBytes(18).toString('base64url').replace(/[-_]/g, '0')}`
      const thing = { id, object: kinds[prefix], created: seconds(), livemode: false, ...fields }
      kept.things[id] = thing
      return thing
    },

    /** A copy to be sent, with the things in place of their ids where that was asked for. */
    shown: (thing, paths = []) =>
      structuredClone(paths.reduce((so, path) => expand(so, path.split('.')), thing)),

    /** A list as the service sends it, newest first. */
    listed(kind, url, { most = 10, keep = () => true } = {}) {
      const all = things(kind).filter(keep).reverse()
      return { object: 'list', url, has_more: all.length > most, data: structuredClone(all.slice(0, most)) }
    },

    things,
  }
}

/** Now, as the service counts time: whole seconds. */
export const seconds = () => Math.floor(Date.now() / 1000)
