import { expect, it } from 'vitest'
import { safePath } from '@/app/_server/session/safe-path'

it.each(['/drafts', '/drafts/1?page=2#front', '/invitation?token=a%20b'])('goes back to %s', (path) => {
  expect(safePath(path)).toBe(path)
})

it.each([
  'https://evil.example',
  '//evil.example',
  '/\\evil.example',
  '\\\\evil.example',
  'javascript:alert(1)',
  '/\t/evil.example',
  '/\n/evil.example',
  'drafts',
  '',
  null,
  undefined,
])('stays inside for %j', (path) => {
  expect(safePath(path)).toBe('/home')
})
