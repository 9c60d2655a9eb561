import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { randomUUID } from 'node:crypto'
import { join } from 'node:path'

/**
 * @typedef {object} Message
 * @property {string} id
 * @property {string} from
 * @property {string[]} to addresses, in lower case
 * @property {string} subject
 * @property {string} date ISO 8601
 * @property {string} text
 * @property {string} html '' when the message has none
 */

/**
 * Messages kept as files, one each, so that they are still there after a restart.
 * @param {string} folder
 */
export function openMailbox(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 })

  return {
    /** @param {Omit<Message, 'id'>} message */
    keep(message) {
      // The time first: names in order are messages in order.
      const id = `${String(Date.now()).padStart(15, '0')}-${randomUUID()}`
      const path = join(folder, `${id}.json`)
      writeFileSync(`${path}.new`, JSON.stringify({ id, ...message }), { mode: 0o600 })
      renameSync(`${path}.new`, path)
      return id
    },

    /**
     * Newest first.
     * @param {string} [to] only those to this address
     * @returns {Message[]}
     */
    list(to) {
      const names = readdirSync(folder).filter((name) => name.endsWith('.json'))
      const messages = names
        .sort()
        .reverse()
        .map((name) => JSON.parse(readFileSync(join(folder, name), 'utf8')))
      return to ? messages.filter((message) => message.to.includes(to.toLowerCase())) : messages
    },
  }
}
