import * as z from 'zod'
import { roles } from '../permissions'
import { emailShape } from './email'
import { idShape, requiredLine } from './ids'
import { unitShape } from './length'
import { newPasswordShape } from './password'
import { timeZoneShape } from './workroom'

const tokenShape = z.string('Open the link from the mail.').max(100, 'Open the link from the mail.')
const personName = requiredLine(120, 'your name')

export const joinShape = z.strictObject({
  email: emailShape,
  name: personName,
  workroomName: requiredLine(120, 'the name of your workroom'),
})

export const confirmJoinShape = z.strictObject({
  token: tokenShape,
  password: newPasswordShape,
  unit: unitShape,
  timeZone: timeZoneShape,
})

export const forgottenShape = z.strictObject({ email: emailShape })

export const resetShape = z.strictObject({ token: tokenShape, password: newPasswordShape })

export const changePasswordShape = z.strictObject({
  current: z.string('Write your present password.').min(1, 'Write your present password.').max(200),
  next: newPasswordShape,
})

/** At least one role, each once. */
export const rolesShape = z.preprocess(
  (value) => (typeof value === 'string' ? [value] : value),
  z
    .array(z.enum(roles, 'This role is not known.'), 'Choose at least one role.')
    .min(1, 'Choose at least one role.')
    .max(roles.length)
    .transform((chosen) => [...new Set(chosen)]),
)

export const inviteShape = z.strictObject({ id: idShape, email: emailShape, roles: rolesShape })

export const acceptShape = z.strictObject({ token: tokenShape, name: personName, password: newPasswordShape })
export const acceptKnownShape = z.strictObject({ token: tokenShape })

export const changeRolesShape = z.strictObject({ membershipId: idShape, roles: rolesShape })
export const disableMemberShape = z.strictObject({ membershipId: idShape, disabled: z.boolean() })
