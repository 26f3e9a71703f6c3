/** One field of a form and what is wrong with it, in the user's words. */
export interface FieldProblem {
  field: string;
  text: string;
}

interface ProblemBody {
  title?: string;
  detail?: string;
  code?: string;
  errors?: FieldProblem[];
}

/** What the API answered instead of doing it (RFC 9457 problem details), or that it could not be reached. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  readonly status: number;
  /** The stable code, for programs; `unreachable` when no answer came. */
  readonly code: string;
  readonly errors: FieldProblem[];

  constructor(status: number, body: ProblemBody) {
    super(body.detail ?? body.title ?? `The service answered ${status}.`);
    this.status = status;
    this.code = body.code ?? `http-${status}`;
    this.errors = body.errors ?? [];
  }
}

/** The problem of a request that got no answer at all. */
export const unreachable = (): ApiProblem =>
  new ApiProblem(0, {
    code: 'unreachable',
    detail: 'The service could not be reached. Check the connection; what you typed is still here.',
  });

/** Any error as a problem that can be shown. */
export const asProblem = (error: unknown): ApiProblem =>
  error instanceof ApiProblem
    ? error
    : new ApiProblem(0, {
        code: 'unexpected',
        detail: error instanceof Error ? error.message : String(error),
      });
