import { ArrowDown, ArrowUp } from 'lucide-react'
import Link from 'next/link'

/** The head of a column that the list can be sorted by; pressing it again turns the order round. */
export function SortLink({
  label,
  sorted,
  href,
}: {
  readonly label: string
  readonly sorted: 'ascending' | 'descending' | undefined
  readonly href: string
}) {
  const Arrow = sorted === 'descending' ? ArrowDown : ArrowUp
  return (
    <Link href={href} className="inline-flex min-h-6 items-center gap-1 hover:text-indigo">
      {label}
      {sorted && <Arrow size={14} aria-hidden />}
    </Link>
  )
}
