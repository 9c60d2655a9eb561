/** Something the studio can do: menu, shortcut and help all read this one object. */
export interface Command {
  readonly id: string
  readonly label: string
  /** 'Mod+Shift+Z': Mod is Ctrl, or ⌘ on a Mac. Absent when there is none. */
  readonly shortcut?: string
  readonly enabled: () => boolean
  readonly perform: () => void
  /** False for what only changes the view. */
  readonly undoable: boolean
}

export interface KeyPress {
  readonly key: string
  readonly ctrlKey: boolean
  readonly metaKey: boolean
  readonly shiftKey: boolean
  readonly altKey: boolean
}

/** Whether a key press is a shortcut. Letters compare without case; a sign such as + counts with or without Shift. */
export function isShortcut(shortcut: string, press: KeyPress): boolean {
  const parts = shortcut.split('+').filter(Boolean)
  const key = (shortcut.endsWith('+') ? '+' : (parts.at(-1) ?? '')).toLowerCase()
  const mod = parts.includes('Mod')
  const shift = parts.includes('Shift')
  const letter = /^[a-z]$/.test(key)
  return (
    press.key.toLowerCase() === key &&
    (press.ctrlKey || press.metaKey) === mod &&
    press.altKey === parts.includes('Alt') &&
    (!letter && !shift ? true : press.shiftKey === shift)
  )
}

/** The command a key press asks for, when it may be done now. */
export function commandFor(commands: readonly Command[], press: KeyPress): Command | undefined {
  return commands.find(
    (command) => command.shortcut && isShortcut(command.shortcut, press) && command.enabled(),
  )
}

/** 'Mod+Shift+Z' as the device writes it: ⇧⌘Z or Ctrl+Shift+Z. */
export function shortcutText(shortcut: string, mac: boolean): string {
  if (!mac) return shortcut.replace('Mod', 'Ctrl')
  return shortcut.replace('Shift+', '⇧').replace('Alt+', '⌥').replace('Mod+', '⌘')
}
