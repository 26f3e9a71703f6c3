import { HttpException } from '@nestjs/common';
import { errorCodes, type ErrorCode } from '@lidwatch/contracts';
import { Problem } from './problem';

const codesByStatus: Record<number, ErrorCode> = {
  400: 'bad-request',
  401: 'sign-in-needed',
  403: 'not-allowed',
  404: 'not-found',
  405: 'method-not-allowed',
  408: 'bad-request',
  413: 'too-large',
  415: 'type-not-served',
  422: 'invalid',
  429: 'too-many-attempts',
  503: 'not-ready',
};

const details: Partial<Record<ErrorCode, string>> = {
  'sign-in-needed': 'Sign in to go on.',
  'not-allowed': 'Your role may not do this.',
  'too-large': 'The request is larger than this address takes. Send it in smaller parts.',
  'type-not-served': 'Send application/json, or what this address says it takes.',
  'not-ready': 'The service is starting or its database does not answer. Try again shortly.',
  unexpected: 'Try again. If it stays, tell your administrator the time at which it happened.',
};

/**
 * Any thrown thing as a Problem. Body-parser errors carry a status and a type; what carries no client status is
 * `unexpected`, and its message stays in the log.
 */
export function toProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  const status = error instanceof HttpException ? error.getStatus() : clientStatusOf(error);
  const code = codesByStatus[status] ?? (status < 500 ? 'bad-request' : 'unexpected');
  return new Problem(code, detailOf(code, error));
}

function clientStatusOf(error: unknown): number {
  const { status, expose } = (error ?? {}) as { status?: unknown; expose?: unknown };
  return typeof status === 'number' && expose === true ? status : 500;
}

/** What Nest and the body parser say, in the user's words. */
const inPlainWords: readonly [RegExp, string][] = [
  [/^Cannot [A-Z]+ \//, 'There is nothing at this address.'],
  [/in JSON|JSON input|is not valid JSON/, 'The body is not valid JSON.'],
  [/^Failed to decode param|URI malformed/, 'The address is not written correctly.'],
  [/numeric string is expected/, 'The number in the address is not a whole number.'],
];

function detailOf(code: ErrorCode, error: unknown): string {
  const { type = '' } = (error ?? {}) as { type?: string };
  if (/^(encoding|charset)\.unsupported$/.test(type)) return 'Send the body as UTF-8 text.';
  const fixed = details[code];
  if (fixed) return fixed;
  const message = error instanceof Error ? error.message : '';
  const plain = inPlainWords.find(([pattern]) => pattern.test(message));
  return plain?.[1] ?? (message || errorCodes[code].title);
}
