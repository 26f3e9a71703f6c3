import { ValidationPipe, type ValidationError } from '@nestjs/common';
import type { FieldError } from '@lidwatch/contracts';
import { Problem } from './problem';

/**
 * Checks every body and query against its class: unknown fields are refused, and each fault names its field.
 * Answers 422 `invalid` with the list.
 */
export function validationPipe(): ValidationPipe {
  return new ValidationPipe({
    transform: true,
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    exceptionFactory: (errors) => invalid(errors.flatMap((error) => fieldErrors(error, ''))),
  });
}

/** A 422 with one or more faults. */
export function invalid(errors: FieldError[]): Problem {
  const words = errors.map(({ text }) => text).join(' ');
  return new Problem('invalid', words || 'Some entries are not valid.', { errors });
}

function fieldErrors(error: ValidationError, parent: string): FieldError[] {
  const step = /^\d+$/.test(error.property) ? `[${error.property}]` : `.${error.property}`;
  const field = parent === '' ? error.property : `${parent}${step}`;
  const own = Object.values(error.constraints ?? {}).map((text) => ({ field, text: sentence(text) }));
  return [...own, ...(error.children ?? []).flatMap((child) => fieldErrors(child, field))];
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1).replace(/\.?$/, '.')}`;
}
