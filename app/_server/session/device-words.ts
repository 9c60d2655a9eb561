/** Browsers by the word in their user agent; the first that fits names it, because each also claims to be older ones. */
const browsers = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(?:Firefox|FxiOS)\//, 'Firefox'],
  [/\b(?:Chrome|CriOS|Chromium|HeadlessChrome)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
] as const

const systems = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMac OS X\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
] as const

const wordFor = (names: readonly (readonly [RegExp, string])[], text: string) =>
  names.find(([pattern]) => pattern.test(text))?.[1]

/**
 * A device in words that its owner knows it by, such as 'Firefox on Windows'. Nothing else of the user agent is kept.
 * @returns '' when nothing is recognised
 */
export function deviceWords(userAgent: string | null | undefined): string {
  const text = userAgent ?? ''
  return [wordFor(browsers, text), wordFor(systems, text)].filter(Boolean).join(' on ')
}
