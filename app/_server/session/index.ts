export { publicAction, signedInAction, workroomAction } from './workroom-action'
export { currentSession, requireActor, requireSignedIn } from './current'
export { forPage } from './for-page'
export { workroomRoute } from './workroom-route'
