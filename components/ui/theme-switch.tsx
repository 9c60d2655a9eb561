'use client'

import { MoonStar, Sun, SunMoon } from 'lucide-react'
import { useState, useSyncExternalStore } from 'react'
import { classes } from './classes'
import { themeFrom, wearTheme, type Theme } from './theme'

const choices = [
  { theme: undefined, word: 'As device', Icon: SunMoon },
  { theme: 'light', word: 'Daylight', Icon: Sun },
  { theme: 'dark', word: 'Lamp on', Icon: MoonStar },
] as const

const never = () => () => {}

/** Daylight, lamp, or whatever the device says. Kept in a cookie for a year. */
export function ThemeSwitch() {
  const onPage = useSyncExternalStore(
    never,
    () => themeFrom(document.documentElement.dataset.theme),
    () => undefined,
  )
  const [chosen, choose] = useState<{ theme: Theme | undefined }>()
  const theme = chosen ? chosen.theme : onPage

  function wear(next: Theme | undefined) {
    choose({ theme: next })
    wearTheme(next)
  }

  return (
    <div role="group" aria-label="Light" className="flex w-fit rounded border hairline text-sm">
      {choices.map(({ theme: own, word, Icon }) => (
        <button
          key={word}
          type="button"
          aria-pressed={theme === own}
          onClick={() => wear(own)}
          className={classes(
            'flex min-h-8 items-center gap-1.5 rounded px-2.5 text-walnut',
            theme === own && 'bg-panel text-ink',
          )}
        >
          <Icon size={16} aria-hidden />
          {word}
        </button>
      ))}
    </div>
  )
}
