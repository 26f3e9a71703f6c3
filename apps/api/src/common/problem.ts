import { HttpException } from '@nestjs/common';
import { statusOf, type ErrorCode, type FieldError } from '@lidwatch/contracts';

/**
 * An error that the caller is told about: a stable code, whose table gives the status, and a detail that says what is
 * wrong and what to do, in the user's words.
 */
export class Problem extends HttpException {
  override readonly name = 'Problem';

  constructor(
    readonly code: ErrorCode,
    readonly detail: string,
    readonly extra: { errors?: FieldError[]; [key: string]: unknown } = {},
  ) {
    super(detail, statusOf(code));
  }
}
