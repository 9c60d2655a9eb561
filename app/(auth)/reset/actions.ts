'use server'

import { publicAction } from '@/app/_server/session'
import { resetPassword } from '@/db/access/new-passwords'
import { resetShape } from '@/db/shapes/account'

/** Sets a new password by the link of a mail; every device is signed out. */
export const reset = publicAction(resetShape, async (input) => resetPassword(input))
