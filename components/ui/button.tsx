import Link from 'next/link'
import type { ComponentProps } from 'react'
import { classes } from './classes'

export type ButtonLook = 'primary' | 'plain' | 'quiet' | 'danger'

const base =
  'inline-flex min-h-10 items-center justify-center gap-2 rounded px-4 py-1.5 font-semibold no-underline ' +
  'transition-colors disabled:cursor-not-allowed disabled:opacity-55 aria-disabled:opacity-55'

const looks: Record<ButtonLook, string> = {
  primary: 'bg-indigo text-ground hover:bg-ink',
  plain: 'border border-rule bg-sheet text-ink hover:border-indigo hover:text-indigo',
  quiet: 'text-indigo hover:bg-panel',
  danger: 'border border-madder text-madder hover:bg-madder hover:text-ground',
}

/** The class of a button, for links and triggers that must look like one. */
export function buttonClass(look: ButtonLook = 'plain', extra?: string): string {
  return classes(base, looks[look], extra)
}

/** A button. `busy` keeps it in place, says so to a screen reader and refuses a second press. */
export function Button({
  look = 'plain',
  busy = false,
  className,
  type = 'button',
  ...rest
}: ComponentProps<'button'> & { look?: ButtonLook; busy?: boolean }) {
  return (
    <button
      {...rest}
      type={type}
      aria-busy={busy || undefined}
      disabled={rest.disabled || busy}
      className={buttonClass(look, className)}
    />
  )
}

/** A link that looks like a button. */
export function ButtonLink({
  look = 'plain',
  className,
  ...rest
}: ComponentProps<typeof Link> & { look?: ButtonLook }) {
  return <Link {...rest} className={buttonClass(look, className)} />
}
