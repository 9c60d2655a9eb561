import { describe, expect, it } from 'vitest'
import { commandFor, isShortcut, shortcutText, type Command } from '@/components/studio/commands'

const press = (
  key: string,
  held: Partial<Record<'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey', boolean>> = {},
) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  shiftKey: false,
  altKey: false,
  ...held,
})

const command = (id: string, shortcut: string, enabled = true): Command => ({
  id,
  label: id,
  shortcut,
  enabled: () => enabled,
  perform: () => {},
  undoable: false,
})

describe('commands', () => {
  it('tells undo from redo by Shift', () => {
    const both = [command('undo', 'Mod+Z'), command('redo', 'Mod+Shift+Z')]
    expect(commandFor(both, press('z', { ctrlKey: true }))?.id).toBe('undo')
    expect(commandFor(both, press('Z', { metaKey: true, shiftKey: true }))?.id).toBe('redo')
    expect(commandFor(both, press('z'))).toBeUndefined()
  })

  it('does nothing for a command that is not enabled', () => {
    expect(commandFor([command('undo', 'Mod+Z', false)], press('z', { ctrlKey: true }))).toBeUndefined()
  })

  it('knows + whether or not the keyboard needs Shift for it', () => {
    expect(isShortcut('Mod++', press('+', { ctrlKey: true, shiftKey: true }))).toBe(true)
    expect(isShortcut('Mod++', press('+', { ctrlKey: true }))).toBe(true)
    expect(isShortcut('Mod++', press('+'))).toBe(false)
  })

  it('writes a shortcut as the device does', () => {
    expect(shortcutText('Mod+Shift+Z', false)).toBe('Ctrl+Shift+Z')
    expect(shortcutText('Mod+Shift+Z', true)).toBe('⌘⇧Z')
  })
})
