import { Checkbox } from '@/components/ui/checkbox'
import { type Role, roles } from '@/db/permissions'
import { roleWords } from './role-words'

/** A tick box for each role; a person may have several. */
export function RoleBoxes({
  held = [],
  error,
}: {
  readonly held?: readonly Role[]
  readonly error?: string
}) {
  return (
    <fieldset className="grid gap-2">
      <legend className="mb-1 text-sm font-semibold">Roles</legend>
      {roles.map((role) => (
        <Checkbox
          key={role}
          name="roles"
          value={role}
          defaultChecked={held.includes(role)}
          label={roleWords[role].name}
          hint={roleWords[role].does}
        />
      ))}
      {error && (
        <p role="alert" className="text-sm text-madder">
          {error}
        </p>
      )}
    </fieldset>
  )
}
