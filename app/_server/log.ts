import 'server-only'
import pino from 'pino'

/** One line of JSON an event. Never measurements, tokens, passwords or the text of mail. */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: undefined,
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: ['password', 'token', '*.password', '*.token'],
})
