import { pino, type Logger } from 'pino'

/** One line of JSON an event. What could open a door is never written. */
export function createLogger(level: string): Logger {
  return pino({
    level,
    redact: ['req.headers.cookie', 'req.headers["quote-link"]', 'res.headers["set-cookie"]'],
  })
}
