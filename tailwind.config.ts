import type { Config } from 'tailwindcss'

/** Every colour is a dye or a cloth of the look; its two values (paper, cloth) stand once, in app/globals.css. */
const dyes = [
  'ground',
  'sheet',
  'panel',
  'ink',
  'indigo',
  'madder',
  'weld',
  'fern',
  'walnut',
  'rule',
] as const

const config: Config = {
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(dyes.map((dye) => [dye, `var(--${dye})`])),
    },
    fontFamily: { sans: ['"Source Sans 3"', '"Source Sans Fallback"', 'system-ui', 'sans-serif'] },
    fontWeight: { normal: '400', semibold: '600' },
    fontSize: {
      tag: ['13px', '18px'],
      sm: ['14px', '20px'],
      base: ['16px', '24px'],
      lg: ['20px', '28px'],
      xl: ['26px', '32px'],
      '2xl': ['34px', '40px'],
    },
    borderRadius: { none: '0', DEFAULT: '6px', full: '9999px' },
    boxShadow: { none: 'none', float: '0 8px 32px rgb(27 33 64 / 0.18)' },
    screens: { sm: '40rem', md: '52rem', lg: '64rem', xl: '80rem' },
  },
}

export default config
