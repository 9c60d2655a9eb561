import { Search } from 'lucide-react'
import Form from 'next/form'
import Link from 'next/link'
import { Button } from '@/components/ui/button'
import { controlClass } from '@/components/ui/field'

/** Looks for text in a list. The search stands in the address, so that it can be kept and sent. */
export function SearchForm({
  action,
  label,
  search,
  kept = {},
}: {
  readonly action: string
  readonly label: string
  readonly search: string
  /** Other parts of the address that stay as they are. */
  readonly kept?: Readonly<Record<string, string>>
}) {
  return (
    <Form action={action} role="search" className="mb-6 flex flex-wrap items-center gap-2">
      {Object.entries(kept).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <input
        type="search"
        name="search"
        key={search}
        defaultValue={search}
        aria-label={label}
        placeholder={label}
        className={`${controlClass} min-w-0 flex-1 sm:max-w-80`}
      />
      <Button type="submit">
        <Search size={18} aria-hidden />
        Search
      </Button>
      {search && (
        <Link href={action} className="px-2 text-sm text-indigo underline underline-offset-4">
          Show all
        </Link>
      )}
    </Form>
  )
}
