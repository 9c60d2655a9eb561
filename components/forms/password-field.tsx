'use client'

import { Eye, EyeOff } from 'lucide-react'
import { type ComponentProps, useState } from 'react'
import { controlClass, FieldFrame, type FieldWords } from '../ui/field'

/** A password, hidden until asked for. Pasting and password managers are welcome. */
export function PasswordField({
  label,
  hint,
  error,
  ...rest
}: FieldWords & { readonly autoComplete: 'current-password' | 'new-password' } & ComponentProps<'input'>) {
  const [shown, show] = useState(false)
  const Icon = shown ? EyeOff : Eye
  return (
    <FieldFrame {...{ label, hint, error }}>
      {(control) => (
        <div className="flex gap-2">
          <input
            {...rest}
            {...control}
            type={shown ? 'text' : 'password'}
            autoCapitalize="none"
            spellCheck={false}
            className={controlClass}
          />
          <button
            type="button"
            aria-pressed={shown}
            onClick={() => show(!shown)}
            className="flex min-h-10 min-w-20 items-center justify-center gap-1.5 rounded border hairline text-sm text-walnut hover:text-ink"
          >
            <Icon size={16} aria-hidden />
            {shown ? 'Hide' : 'Show'}
          </button>
        </div>
      )}
    </FieldFrame>
  )
}
