import Link from 'next/link'
import { buttonClass } from '@/components/ui/button'

/** Pages of a list: where we are, and the way to the ones beside it. Draws nothing for a single page. */
export function Pager({
  page,
  pages,
  total,
  what,
  href,
}: {
  readonly page: number
  readonly pages: number
  readonly total: number
  /** In the plural: 'clients'. */
  readonly what: string
  readonly href: (page: number) => string
}) {
  if (pages <= 1) return null
  return (
    <nav aria-label="Pages" className="mt-6 flex flex-wrap items-center gap-4 text-sm text-walnut">
      {page > 1 && (
        <Link href={href(page - 1)} rel="prev" className={buttonClass('plain')}>
          Before
        </Link>
      )}
      <span>
        Page {page} of {pages}, {total} {what}
      </span>
      {page < pages && (
        <Link href={href(page + 1)} rel="next" className={buttonClass('plain')}>
          Next
        </Link>
      )}
    </nav>
  )
}
