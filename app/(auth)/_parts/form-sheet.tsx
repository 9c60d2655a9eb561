import type { ReactNode } from 'react'

/** A title, why the form is there, the form, and where else to go. */
export function FormSheet({
  title,
  lead,
  children,
  foot,
}: {
  readonly title: string
  readonly lead?: ReactNode
  readonly children?: ReactNode
  readonly foot?: ReactNode
}) {
  return (
    <>
      <h1 className="text-xl leading-tight font-semibold tracking-tight sm:text-2xl">{title}</h1>
      {lead && <div className="mt-2 text-walnut">{lead}</div>}
      {children && <div className="mt-7">{children}</div>}
      {foot && <div className="mt-8 grid gap-2 border-t hairline pt-5 text-walnut">{foot}</div>}
    </>
  )
}
