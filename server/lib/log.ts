import pino, { type Logger } from 'pino';

export type { Logger };

/** One line of JSON an event; tokens and cookies never reach it. */
export function createLog(level: string): Logger {
  return pino({
    level,
    redact: ['req.headers.authorization', 'req.headers.cookie', 'res.headers["set-cookie"]'],
  });
}
