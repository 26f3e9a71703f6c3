import {
  BadRequestException,
  ForbiddenException,
  NotFoundException,
  ServiceUnavailableException,
} from '@nestjs/common';
import { Problem } from './problem';
import { toProblem } from './to-problem';

/** A body-parser fault, as http-errors makes it. */
const parserFault = (status: number, type: string, expose = true) =>
  Object.assign(new Error(type), { status, type, expose });

const cases: [string, unknown, number, string, string][] = [
  [
    'a problem',
    new Problem('already-done', 'Confirmed by T. Nakai.'),
    409,
    'already-done',
    'Confirmed by T. Nakai.',
  ],
  [
    'an unknown address',
    new NotFoundException('Cannot GET /api/x'),
    404,
    'not-found',
    'There is nothing at this address.',
  ],
  [
    'broken JSON',
    new BadRequestException('Unexpected token x in JSON at 3'),
    400,
    'bad-request',
    'The body is not valid JSON.',
  ],
  [
    'an id that is none',
    new BadRequestException('Validation failed (numeric string is expected)'),
    400,
    'bad-request',
    'The number in the address is not a whole number.',
  ],
  ['a refusal', new ForbiddenException(), 403, 'not-allowed', 'Your role may not do this.'],
  [
    'a large body',
    parserFault(413, 'entity.too.large'),
    413,
    'too-large',
    'The request is larger than this address takes. Send it in smaller parts.',
  ],
  [
    'a strange charset',
    parserFault(415, 'charset.unsupported'),
    415,
    'type-not-served',
    'Send the body as UTF-8 text.',
  ],
  [
    'a service that is not ready',
    new ServiceUnavailableException(),
    503,
    'not-ready',
    'The service is starting or its database does not answer. Try again shortly.',
  ],
];

describe('every error as a problem', () => {
  it.each(cases)('%s', (_, error, status, code, detail) => {
    const problem = toProblem(error);
    expect({ status: problem.getStatus(), code: problem.code, detail: problem.detail }).toEqual({
      status,
      code,
      detail,
    });
  });

  it.each([new Error('SQLITE_CORRUPT: secret table'), 'a text', undefined, parserFault(502, 'x', false)])(
    'tells nothing of %p',
    (error) => {
      const problem = toProblem(error);
      expect(problem.code).toBe('unexpected');
      expect(problem.detail).not.toMatch(/SQLITE|text|undefined/);
    },
  );
});
