import pino from 'pino'

/** One JSON line per event, on standard output. */
export const log = pino({ base: null, level: process.env.LOG_LEVEL || 'info' })
