import { round } from './round'
import type { Neckline } from './neckline'

/** High: a round close neck that a funnel is set on, which stands up above the neck. */
export const high: Neckline = { ...round, takesCollar: 'funnel' }
