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
  groups = [],
  ...rest
}: FieldWords & {
  readonly className?: string
  readonly choices: readonly Choice[]
  /** More choices, under headings, after the others. */
  readonly groups?: readonly { readonly label: string; readonly choices: readonly Choice[] }[]
} & ComponentProps<'select'>) {
  return (
    <FieldFrame {...{ label, hint, error, hideLabel, className }}>
      {(control) => (
        <select {...rest} {...control} className={controlClass}>
          {choices.map(option)}
          {groups.map((group) => (
            <optgroup key={group.label} label={group.label}>
              {group.choices.map(option)}
            </optgroup>
          ))}
        </select>
      )}
    </FieldFrame>
  )
}

function option({ value, label }: Choice) {
  return (
    <option key={value} value={value}>
      {label}
    </option>
  )
}
