import { localName, localNames } from './local-copy'
import { forgetOpened } from './opened-drafts'

const key = 'chalkfold here'
const channelName = 'chalkfold'
const signedOut = 'signed out'

/** Who was last signed in on this device, and where; nobody after a sign-out. Browser only. */
export function whoIsHere(): { readonly userId: string; readonly workroomId: string } | undefined {
  const [userId, workroomId] = localStorage.getItem(key)?.split(' ') ?? []
  return userId && workroomId ? { userId, workroomId } : undefined
}

/** Notes who is signed in. What somebody else opened here before opens here no more. */
export async function noteHere(userId: string, workroomId: string): Promise<void> {
  const before = whoIsHere()
  localStorage.setItem(key, `${userId} ${workroomId}`)
  if (before?.userId === userId) return
  const others = (await localNames()).filter((name) => !name.startsWith(localName(userId, '')))
  await Promise.all(others.map(forgetOpened))
}

/** After a sign-out: nobody is here, and the other open pages hear of it. */
export function forgetHere(): void {
  localStorage.removeItem(key)
  const channel = new BroadcastChannel(channelName)
  channel.postMessage(signedOut)
  channel.close()
}

/** Calls back when somebody has signed out in another page of this browser. @returns stops listening */
export function onSignedOut(call: () => void): () => void {
  const channel = new BroadcastChannel(channelName)
  channel.onmessage = ({ data }) => {
    if (data === signedOut) call()
  }
  return () => channel.close()
}
