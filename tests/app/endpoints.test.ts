import { describe, expect, it } from 'vitest'
import { endpoints } from '../security/endpoints'
import { inlineActions, sourceEndpoints } from '../support/source-endpoints'

/** Written out instead of wrapped, because there is nobody to ask for: health, the files of the build, and signing in itself. */
const written = new Set([
  'GET /api/health',
  'GET /api/shell',
  'GET /api/auth/[...nextauth]',
  'POST /api/auth/[...nextauth]',
])

/** What checks who calls: by the cookie, or by the secret in a link. */
function wrapperFor(name: string): string {
  const { access } = endpoints[name] ?? {}
  if (!name.includes('#')) return access === 'anybody' ? 'sharedRoute' : 'workroomRoute'
  if (access === 'anybody') return 'publicAction'
  return access === 'signed-in' ? 'signedInAction' : 'workroomAction'
}

const found = sourceEndpoints()

describe('every endpoint in the sources', () => {
  it('stands in the table of who gets through, and nothing else does', () => {
    expect(found.map(({ name }) => name).sort()).toEqual(Object.keys(endpoints).sort())
  })

  it.each(found.filter(({ name }) => !written.has(name)))(
    '$name checks who calls it',
    ({ name, wrapper }) => {
      expect(wrapper).toBe(wrapperFor(name))
    },
  )

  it('is in a file of its own kind: no action hides inside a component', () => {
    expect(inlineActions()).toEqual([])
  })
})
