import 'server-only'
import pino from 'pino'

/**
 * Structured logs with request ids. No personal data: write keys of rows, never names, addresses or texts.
 */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: { app: 'noctuary' },
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: {
    paths: ['*.email', '*.password', '*.token', '*.name', 'headers.cookie', 'headers.authorization'],
    remove: true,
  },
})
