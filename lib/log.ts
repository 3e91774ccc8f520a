import pino from 'pino';

/** One JSON line an event on standard output. Nothing that signs a person in is ever written. */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
  redact: {
    paths: ['password', 'token', 'cookie', 'authorization', '*.password', '*.token', '*.cookie', '*.authorization'],
    censor: '[removed]',
  },
  serializers: { error: pino.stdSerializers.err },
});
