import { ApiError, wrong } from './errors.mjs'

/** A field, or the fields inside it by name or number. @typedef {string | { [name: string]: Field }} Field */

/**
 * The fields of a form body or a query, nested as `a[b][0][c]=value` says.
 * @param {string} text
 * @returns {{ [name: string]: Field }}
 */
export function readForm(text) {
  const fields = Object.create(null)
  for (const [name, value] of new URLSearchParams(text)) {
    const [first, ...inner] = name.split('[').map((step) => step.replace(/\]$/, ''))
    put(fields, [first, ...inner], value)
  }
  return fields
}

function put(fields, [step, ...rest], value) {
  // `list[]=a&list[]=b` counts its members itself.
  const name = step === '' ? String(Object.keys(fields).length) : step
  if (rest.length === 0) {
    fields[name] = value
    return
  }
  fields[name] ??= Object.create(null)
  if (typeof fields[name] === 'string' || rest.length > 8) throw wrong(name, `Invalid object at ${name}`)
  put(fields[name], rest, value)
}

/**
 * Takes known fields out of a form; for those that are not known there is an error, as the service has one.
 * @param {{ [name: string]: Field }} fields
 * @param {string} [inside] name of the field that these are in
 */
export function reader(fields = {}, inside = '') {
  const nameOf = (name) => (inside ? `${inside}[${name}]` : name)
  const taken = new Set()
  const take = (name) => {
    taken.add(name)
    return fields[name]
  }

  function text(name, { most = 5000 } = {}) {
    const value = take(name)
    if (value === undefined || value === '') return undefined
    if (typeof value !== 'string' || value.length > most)
      throw wrong(nameOf(name), `Invalid string: ${nameOf(name)} is text of at most ${most} characters`)
    return value
  }

  function required(name, value) {
    if (value !== undefined) return value
    throw wrong(nameOf(name), `Missing required param: ${nameOf(name)}.`, 'parameter_missing')
  }

  return {
    text,
    needed: (name) => required(name, text(name)),

    whole(name, { least = 0, most = 99_999_999 } = {}) {
      const value = text(name)
      if (value === undefined) return undefined
      if (!/^-?\d{1,15}$/.test(value))
        throw wrong(nameOf(name), `Invalid integer: ${value}`, 'parameter_invalid_integer')
      const number = Number(value)
      if (number < least || number > most)
        throw wrong(
          nameOf(name),
          `${nameOf(name)} must be from ${least} to ${most}`,
          'parameter_invalid_integer',
        )
      return number
    },

    address(name) {
      const value = required(name, text(name))
      if (URL.canParse(value) && /^https?:$/.test(new URL(value).protocol)) return value
      throw wrong(nameOf(name), 'Not a valid URL', 'url_invalid')
    },

    /** Up to 50 notes of one's own. */
    metadata(name = 'metadata') {
      const value = take(name)
      if (value === undefined || value === '') return {}
      const notes = Object.entries(typeof value === 'string' ? { '': value } : value)
      const bad = notes.find(
        ([key, note]) => key === '' || key.length > 40 || typeof note !== 'string' || note.length > 500,
      )
      if (bad || notes.length > 50)
        throw wrong(nameOf(name), 'Metadata are at most 50 texts of 500 characters, under names of 40.')
      return Object.fromEntries(notes.filter(([, note]) => note !== ''))
    },

    /** The readers of a field's own fields, in their order. */
    list(name) {
      const value = take(name)
      if (value === undefined) return []
      if (typeof value === 'string') throw wrong(nameOf(name), `Invalid array: ${nameOf(name)}`)
      return Object.entries(value).map(([index, each]) => {
        if (typeof each === 'string') throw wrong(nameOf(name), `Invalid object: ${nameOf(name)}[${index}]`)
        return reader(each, `${nameOf(name)}[${index}]`)
      })
    },

    inner(name) {
      const value = take(name)
      if (typeof value === 'string') throw wrong(nameOf(name), `Invalid object: ${nameOf(name)}`)
      return reader(value, nameOf(name))
    },

    /** The texts of a list. */
    texts: (name) => Object.values(take(name) ?? {}).map(String),

    /** @throws {ApiError} for a field that nothing has asked for */
    end() {
      const unknown = Object.keys(fields).find((name) => !taken.has(name))
      if (unknown === undefined) return
      throw new ApiError(400, {
        code: 'parameter_unknown',
        param: nameOf(unknown),
        message: `Received unknown parameter: ${nameOf(unknown)}`,
      })
    },
  }
}
