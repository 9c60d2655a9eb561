/** The cookie that remembers a chosen theme, so that the first byte of the next page already wears it. */
export const themeCookie = 'theme'

export type Theme = 'light' | 'dark'

/** A cookie's text → the theme it names, or nothing when the device should decide. */
export function themeFrom(text: string | undefined): Theme | undefined {
  return text === 'light' || text === 'dark' ? text : undefined
}

/** Puts a theme on the page and remembers it for a year; without one the device decides again. Browser only. */
export function wearTheme(theme: Theme | undefined): void {
  if (theme) document.documentElement.dataset.theme = theme
  else delete document.documentElement.dataset.theme
  document.cookie = `${themeCookie}=${theme ?? ''}; path=/; max-age=${theme ? 31_536_000 : 0}; samesite=lax`
}
