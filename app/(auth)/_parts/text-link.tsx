import Link from 'next/link'
import type { ComponentProps } from 'react'

/** A link inside a sentence, big enough for a thumb. */
export function TextLink(props: ComponentProps<typeof Link>) {
  return (
    <Link
      {...props}
      className="inline-block py-0.5 font-semibold text-indigo underline decoration-rule underline-offset-4 hover:decoration-indigo"
    />
  )
}
