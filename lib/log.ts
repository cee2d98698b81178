import pino from 'pino'

/** One JSON line per event. Never an address, a token or a letter's text: ids only. */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: { process: process.env.TURNROW_PROCESS ?? 'web' },
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: ['password', 'token', '*.password', '*.token', '*.email', 'headers.cookie', 'headers.authorization'],
})
