import type { AddressInfo } from 'node:net'
import { type ParsedMail, simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'

/** A mail server of a test's own: it can be told to refuse, and shows every header. */
export interface TestSmtp {
  readonly url: string
  readonly received: ParsedMail[]
  refusing: boolean
  readonly close: () => Promise<void>
}

export async function startSmtp(): Promise<TestSmtp> {
  const received: ParsedMail[] = []
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData(stream, _session, done) {
      void simpleParser(stream).then((mail) => {
        if (smtp.refusing) return done(new Error('451 come back later'))
        received.push(mail)
        done()
      })
    },
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const { port } = server.server.address() as AddressInfo
  const smtp: TestSmtp = {
    url: `smtp://127.0.0.1:${port}`,
    received,
    refusing: false,
    close: () => new Promise((resolve) => server.close(resolve)),
  }
  return smtp
}
