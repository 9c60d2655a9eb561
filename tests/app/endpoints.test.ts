import { describe, expect, it } from 'vitest'
import { endpoints } from '../security/endpoints'
import { inlineActions, sourceEndpoints } from '../support/source-endpoints'

/** Written out instead of wrapped, each because a visitor without a session opens it. */
const written = new Set(['GET /api/health', 'GET /api/auth/[...nextauth]', 'POST /api/auth/[...nextauth]'])

const found = sourceEndpoints()

describe('every endpoint in the sources', () => {
  it('stands in the table of who gets through, and nothing else does', () => {
    expect(found.map(({ name }) => name).sort()).toEqual(Object.keys(endpoints).sort())
  })

  it.each(found.filter(({ name }) => !written.has(name)))(
    '$name checks who calls it',
    ({ name, wrapper }) => {
      const access = endpoints[name]?.access
      const wanted = name.includes('#')
        ? access === 'anybody'
          ? 'publicAction'
          : access === 'signed-in'
            ? 'signedInAction'
            : 'workroomAction'
        : 'workroomRoute'
      expect(wrapper).toBe(wanted)
    },
  )

  it('is in a file of its own kind: no action hides inside a component', () => {
    expect(inlineActions()).toEqual([])
  })
})
