/**
 * Every error code the API answers with, its HTTP status and its title. The code is stable: clients decide by it,
 * never by the detail's words. It travels in problem details (RFC 9457).
 */
export const errorCodes = {
  'bad-request': { status: 400, title: 'The request could not be read' },
  'sign-in-needed': { status: 401, title: 'Sign in first' },
  'sign-in-failed': { status: 401, title: 'The e-mail or the password is wrong' },
  'key-not-valid': { status: 401, title: 'The ingest key is not valid' },
  'not-allowed': { status: 403, title: 'Your role may not do this' },
  'not-your-district': { status: 403, title: 'This is not one of your districts' },
  'cross-site': { status: 403, title: 'The request came from another site' },
  'password-needed': { status: 403, title: 'Your password is needed again' },
  'password-wrong': { status: 403, title: 'The password is wrong' },
  'signature-not-valid': { status: 403, title: 'The signature is not valid' },
  'not-found': { status: 404, title: 'Nothing is here' },
  'method-not-allowed': { status: 405, title: 'This method is not served here' },
  'already-done': { status: 409, title: 'Somebody was quicker' },
  'changed-meanwhile': { status: 409, title: 'This was changed in the meantime' },
  'not-possible-now': { status: 409, title: 'This cannot be done in its present state' },
  'name-taken': { status: 409, title: 'This name is in use' },
  'preview-out-of-date': { status: 409, title: 'The text differs from the one you saw' },
  'link-not-valid': { status: 410, title: 'This link is not valid' },
  'too-large': { status: 413, title: 'The request is too large' },
  'type-not-served': { status: 415, title: 'This content type is not served' },
  invalid: { status: 422, title: 'Some entries need another look' },
  'rule-not-valid': { status: 422, title: 'The rule is not valid' },
  'too-many-attempts': { status: 429, title: 'Too many attempts' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  unexpected: { status: 500, title: 'Something went wrong on our side' },
  'not-ready': { status: 503, title: 'The service is not ready' },
  'no-room': { status: 507, title: 'The disk of the service is full' },
} as const;

/** A stable error code. */
export type ErrorCode = keyof typeof errorCodes;

/** The HTTP status that belongs to a code. */
export function statusOf(code: ErrorCode): number {
  return errorCodes[code].status;
}

/** What is wrong with one field: its path in the request (`towers[0].mayBegin`) and the words beside it. */
export interface FieldError {
  field: string;
  text: string;
}

/** RFC 9457 problem details as every endpoint answers them. */
export interface ProblemDetails {
  type: string;
  title: string;
  status: number;
  code: ErrorCode;
  detail: string;
  instance: string;
  errors?: FieldError[];
  [extra: string]: unknown;
}
