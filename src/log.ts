import { pino } from 'pino';

export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: ['password', 'token', 'cookie', 'authorization', '*.password', '*.token', '*.cookie', '*.authorization'],
});
