import { useId, type ComponentProps, type ReactNode } from 'react'
import { classes } from './classes'

export interface FieldWords {
  readonly label: ReactNode
  readonly hint?: ReactNode
  /** What is wrong and what a right value looks like. */
  readonly error?: string
  /** Keeps the label for screen readers only. */
  readonly hideLabel?: boolean
}

export const controlClass =
  'min-h-10 w-full rounded border border-rule bg-sheet px-3 py-1.5 text-ink ' +
  'aria-invalid:border-madder aria-invalid:border-2 disabled:opacity-60'

interface FrameProps extends FieldWords {
  readonly className?: string
  readonly children: (control: {
    id: string
    'aria-describedby': string | undefined
    'aria-invalid': true | undefined
  }) => ReactNode
}

/** Label above, control, then hint and error tied to it. Every form control of the product stands in one. */
export function FieldFrame({ label, hint, error, hideLabel, className, children }: FrameProps) {
  const id = useId()
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ')
  return (
    <div className={classes('grid content-start gap-1', className)}>
      <label htmlFor={id} className={hideLabel ? 'sr-only' : 'text-sm font-semibold'}>
        {label}
      </label>
      {children({
        id,
        'aria-describedby': described || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-walnut">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="text-sm text-madder">
          {error}
        </p>
      )}
    </div>
  )
}

type Common = FieldWords & { readonly className?: string }

/** A one-line text field. Extra props reach the input (name, type, autoComplete, ref…). */
export function Field({
  label,
  hint,
  error,
  hideLabel,
  className,
  ...rest
}: Common & ComponentProps<'input'>) {
  return (
    <FieldFrame {...{ label, hint, error, hideLabel, className }}>
      {(control) => <input {...rest} {...control} className={controlClass} />}
    </FieldFrame>
  )
}

/** A field of several lines. */
export function TextField({
  label,
  hint,
  error,
  hideLabel,
  className,
  ...rest
}: Common & ComponentProps<'textarea'>) {
  return (
    <FieldFrame {...{ label, hint, error, hideLabel, className }}>
      {(control) => <textarea rows={3} {...rest} {...control} className={controlClass} />}
    </FieldFrame>
  )
}
