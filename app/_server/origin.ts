import 'server-only'
import { AccessError } from '@/db/access-error'
import { appOrigin } from './config'

/**
 * Refuses a change that another site could have sent. A browser says where a request comes from; a request that says
 * nothing is refused as well.
 * @throws AccessError forbidden
 */
export function requireSameOrigin(headers: Headers): void {
  const site = headers.get('sec-fetch-site')
  if (site === 'same-origin') return
  if (site === null && headers.get('origin') === appOrigin()) return
  throw new AccessError(
    'forbidden',
    `This request did not come from Chalkfold's own pages. Open ${appOrigin()}.`,
  )
}
