import { expect } from 'vitest'
import { AccessError, type AccessErrorCode } from '@/db/access-error'

/** Expects work to be refused with this code. @returns the refusal, to look at its problems */
export async function refusal(work: Promise<unknown>, code: AccessErrorCode): Promise<AccessError> {
  const error: unknown = await work.then(
    () => new Error('It was not refused.'),
    (reason: unknown) => reason,
  )
  expect(error).toBeInstanceOf(AccessError)
  expect(error).toMatchObject({ code })
  return error as AccessError
}
