import { Catch, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import { errorCodes, type ProblemDetails } from '@lidwatch/contracts';
import type { Request, Response } from 'express';
import type { Problem } from './problem';
import { toProblem } from './to-problem';

/** Answers every error as application/problem+json (RFC 9457), and logs those that are ours. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const problem = toProblem(error);
    if (problem.getStatus() >= 500) this.logger.error(error);
    sendProblem(problem, http.getRequest<Request>(), http.getResponse<Response>());
  }
}

/** Writes a problem as the response, unless an answer has begun already. */
export function sendProblem(problem: Problem, request: Request, response: Response): void {
  if (response.headersSent) {
    response.destroy();
    return;
  }
  const body: ProblemDetails = {
    type: 'about:blank',
    title: errorCodes[problem.code].title,
    status: problem.getStatus(),
    code: problem.code,
    detail: problem.detail,
    instance: request.originalUrl.split('?')[0] ?? request.originalUrl,
    ...problem.extra,
  };
  const { retryAfterSeconds } = problem.extra;
  if (typeof retryAfterSeconds === 'number') response.setHeader('Retry-After', retryAfterSeconds);
  response.status(body.status).type('application/problem+json').send(JSON.stringify(body));
}
