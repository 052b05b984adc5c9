import { pino, type DestinationStream, type Logger } from 'pino'

export type { Logger }

/** One JSON record per event on standard output. Nothing that signs a visitor in is ever written. */
export function createLogger(level: string, destination?: DestinationStream): Logger {
  const options = {
    level,
    base: null,
    redact: ['req.headers.cookie', 'req.headers.authorization', 'res.headers["set-cookie"]'],
  }
  return destination === undefined ? pino(options) : pino(options, destination)
}
