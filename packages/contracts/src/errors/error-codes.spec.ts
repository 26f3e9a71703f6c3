import { errorCodes, statusOf, type ErrorCode } from './error-codes';

describe('error codes', () => {
  it.each(Object.keys(errorCodes) as ErrorCode[])('%s has an error status and a title', (code) => {
    expect(statusOf(code)).toBeGreaterThanOrEqual(400);
    expect(statusOf(code)).toBeLessThan(600);
    expect(errorCodes[code].title).toMatch(/^[A-Z].+[^.]$/);
  });
});
