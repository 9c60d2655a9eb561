/** How far what is on the table has got: shown in words in the bar. */
export type SaveState =
  | { readonly kind: 'saved'; readonly at?: string }
  | { readonly kind: 'unsaved' }
  | { readonly kind: 'saving' }
  | { readonly kind: 'offline' }
  | { readonly kind: 'conflict' }
  | { readonly kind: 'signed-out' }
  | { readonly kind: 'refused'; readonly message: string }
  | { readonly kind: 'read-only' }

const words: Record<SaveState['kind'], string> = {
  saved: 'Saved',
  unsaved: 'Not saved yet',
  saving: 'Saving…',
  offline: 'Offline: kept on this device',
  conflict: 'Two versions: choose one',
  'signed-out': 'Signed out: kept on this device',
  refused: 'Not saved: kept on this device',
  'read-only': 'To look at and print',
}

/** The state in the words of the bar. */
export function saveWords(state: SaveState): string {
  return words[state.kind]
}

/** Whether somebody ought to look at it. */
export function needsLook(state: SaveState): boolean {
  return ['offline', 'conflict', 'signed-out', 'refused'].includes(state.kind)
}
