import { ValidateBy, type ValidationOptions } from 'class-validator';
import { readClock } from '../time-keeping/logger-clock';

/** Accepts `UTC`, a fixed offset, or an IANA zone: what a logger's clock may show. */
export function IsLoggerClock(options?: ValidationOptions): PropertyDecorator {
  return ValidateBy(
    {
      name: 'isLoggerClock',
      validator: {
        validate: (value) => typeof value === 'string' && readClock(value) !== undefined,
        defaultMessage: () =>
          'clock must be UTC, a fixed offset such as -07:00, or a zone such as America/Denver',
      },
    },
    options,
  );
}
