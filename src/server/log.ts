import { pino, stdTimeFunctions, type DestinationStream, type Logger } from 'pino';
import { describeError, describeText } from '#src/server/describeError.ts';

export type Log = Logger;

/** One JSON object a line, UTC, on standard output unless told otherwise. JSON keeps line breaks out of the line. */
export function createLog(level: string, destination?: DestinationStream): Log {
  const options = {
    level,
    base: undefined,
    timestamp: stdTimeFunctions.isoTime,
    formatters: { level: (label: string) => ({ level: label }) },
  };
  return destination ? pino(options, destination) : pino(options);
}

/**
 * Brings what libraries print into the same log under the same rules: errors described, texts cleaned.
 *
 * @returns a function that gives the console back
 */
export function captureConsole(log: Log): () => void {
  const before = { error: console.error, warn: console.warn, log: console.log, info: console.info };
  const capture =
    (level: 'error' | 'warn' | 'debug') =>
    (...args: unknown[]) => {
      const errors = args.filter((each) => each instanceof Error).map(describeError);
      const text = args.filter((each) => typeof each === 'string').map(describeText);
      log[level]({ errors }, `console: ${text.join(' ')}`);
    };
  Object.assign(console, {
    error: capture('error'),
    warn: capture('warn'),
    log: capture('debug'),
    info: capture('debug'),
  });
  return () => void Object.assign(console, before);
}
