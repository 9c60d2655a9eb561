import { expect, test } from 'vitest'
import { download } from '@/app/_server/print/download'

const disposition = (...parts: string[]) =>
  download('x', 'application/pdf', parts).headers.get('content-disposition')

test('a file is named after the draft, in plain letters and in its own', () => {
  expect(disposition('Ọlá’s dress', 'A4')).toBe(
    'attachment; filename="ola-s-dress-a4.pdf"; filename*=UTF-8\'\'%E1%BB%8Cl%C3%A1%E2%80%99s%20dress%20A4.pdf',
  )
})

test('a name cannot break out of its header or climb out of its folder', () => {
  const header = disposition('a"; filename="evil.exe\r\nX-Evil: 1', '../../etc/passwd') ?? ''
  expect(header).toMatch(/^attachment; filename="[\w-]+\.pdf"; filename\*=UTF-8''[\w.%~!-]+$/)
  expect(header).not.toContain('%2F')
})

test('a name without a plain letter still has one', () => {
  expect(disposition('服')).toContain('filename="pattern.pdf"')
})

test('no cache keeps it, and as a page it may do nothing', () => {
  const { headers } = download('x', 'image/svg+xml', ['x'])
  expect(headers.get('cache-control')).toBe('private, no-store')
  expect(headers.get('content-security-policy')).toContain("default-src 'none'")
  expect(headers.get('x-content-type-options')).toBe('nosniff')
})
