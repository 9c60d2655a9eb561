import { useId, type ComponentProps, type ReactNode } from 'react'
import { classes } from './classes'

/** A tick box with its words beside it; the words are part of the target. */
export function Checkbox({
  label,
  hint,
  className,
  ...rest
}: { readonly label: ReactNode; readonly hint?: ReactNode } & ComponentProps<'input'>) {
  const id = useId()
  return (
    <div className={classes('grid gap-0.5', className)}>
      <label className="flex min-h-8 items-start gap-2.5 py-1">
        <input
          {...rest}
          type="checkbox"
          aria-describedby={hint ? id : undefined}
          className="mt-0.5 size-5 shrink-0 accent-indigo"
        />
        <span>{label}</span>
      </label>
      {hint && (
        <p id={id} className="pl-7.5 text-sm text-walnut">
          {hint}
        </p>
      )}
    </div>
  )
}
