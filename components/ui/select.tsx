import type { ComponentProps } from 'react'
import { controlClass, FieldFrame, type FieldWords } from './field'

export interface Choice {
  readonly value: string
  readonly label: string
}

/** A drop-down list: the device's own, because it is the one that works everywhere with one hand. */
export function Select({
  label,
  hint,
  error,
  hideLabel,
  className,
  choices,
  ...rest
}: FieldWords & {
  readonly className?: string
  readonly choices: readonly Choice[]
} & ComponentProps<'select'>) {
  return (
    <FieldFrame {...{ label, hint, error, hideLabel, className }}>
      {(control) => (
        <select {...rest} {...control} className={controlClass}>
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      )}
    </FieldFrame>
  )
}
