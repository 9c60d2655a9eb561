import { setTimeout as sleep } from 'node:timers/promises'

/** A message as the local mailbox hands it out. */
export interface KeptMessage {
  readonly id: string
  readonly from: string
  readonly to: readonly string[]
  readonly subject: string
  readonly date: string
  readonly text: string
  readonly html: string
}

/** Messages to this address that the application has sent in this run, newest first. */
export async function mailTo(address: string): Promise<readonly KeptMessage[]> {
  const response = await fetch(`${process.env.MAIL_PAGE_URL}/messages.json?to=${encodeURIComponent(address)}`)
  if (!response.ok) throw new Error(`The mailbox answered ${response.status}.`)
  return (await response.json()) as readonly KeptMessage[]
}

/**
 * Waits for a message, because mail leaves after the request that caused it.
 * @param address of the recipient
 * @param subject that the message must match
 * @param patience in milliseconds
 * @throws {Error} when it has not come in time
 */
export async function waitForMail(address: string, subject: RegExp, patience = 45_000): Promise<KeptMessage> {
  for (let waited = 0; waited < patience; waited += 100) {
    const found = (await mailTo(address)).find((message) => subject.test(message.subject))
    if (found) return found
    await sleep(100)
  }
  throw new Error(`No message matching ${subject} came to ${address} within ${patience / 1000} s.`)
}
