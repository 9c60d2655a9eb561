/**
 * Takes mail by SMTP on the loopback address and keeps it; nothing is ever sent on.
 * @param {ReturnType<import('./mailbox.mjs').openMailbox>} mailbox
 * @param {number} port
 * @returns {Promise<{ stop: () => Promise<void> }>}
 */
export async function listenForMail(mailbox, port) {
  const [{ SMTPServer }, { simpleParser }] = await Promise.all([import('smtp-server'), import('mailparser')])
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    allowInsecureAuth: true,
    onAuth: (auth, _session, done) => done(null, { user: auth.username }),
    onData(stream, session, done) {
      simpleParser(stream).then((mail) => {
        mailbox.keep({
          from: mail.from?.text ?? '',
          to: session.envelope.rcptTo.map(({ address }) => address.toLowerCase()),
          subject: mail.subject ?? '',
          date: (mail.date ?? new Date()).toISOString(),
          text: mail.text ?? '',
          html: mail.html || '',
        })
        done()
      }, done)
    },
  })
  // A client that goes away in the middle of a message is its own affair.
  server.on('error', () => {})
  await new Promise((resolve, reject) => {
    server.server.once('error', reject)
    server.listen(port, '127.0.0.1', resolve)
  })
  return { stop: () => new Promise((resolve) => server.close(() => resolve())) }
}
