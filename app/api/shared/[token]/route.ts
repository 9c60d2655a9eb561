import { sharedRoute } from '@/app/_server/share/shared-route'
import { sharedView } from '@/app/_server/share/shared-view'

/** What a link shows, for a page that has it open: asked again when its window comes to the front. */
export const GET = sharedRoute({}, sharedView)
