import { Module } from '@nestjs/common';
import type { Request } from 'express';
import { LoggerModule } from 'nestjs-pino';
import type { IncomingMessage, ServerResponse } from 'node:http';
import type { LogFn, Logger } from 'pino';
import { Settings } from '../config/settings';

/** Addresses whose requests are not logged, for they are asked every few seconds. */
const quiet = /^\/health\//;

const assembly = new Set([
  'InstanceLoader',
  'NestApplication',
  'NestFactory',
  'RouterExplorer',
  'RoutesResolver',
]);

/** Structured logs: one line per API request with method, path without its query, status and time; nothing secret. */
@Module({
  imports: [
    LoggerModule.forRootAsync({
      inject: [Settings],
      useFactory: (settings: Settings) => ({
        // Under the global prefix: pages and files are not logged.
        forRoutes: ['{*path}'],
        pinoHttp: {
          hooks: { logMethod: leaveOutAssembly },
          level: settings.logLevel,
          customLogLevel: levelOf,
          customSuccessMessage: ({ method }, { statusCode }, ms: number) =>
            `${method} ${statusCode} in ${ms} ms`,
          customErrorMessage: ({ method }, { statusCode }) => `${method} ${statusCode}`,
          autoLogging: { ignore: (request) => quiet.test((request as Request).originalUrl) },
          serializers: {
            req: requestFacts,
            res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
          },
        },
      }),
    }),
  ],
})
export class LoggingModule {}

/** Nest tells of each module and route it puts together; only its warnings and errors are of interest. */
function leaveOutAssembly(this: Logger, args: Parameters<LogFn>, log: LogFn, level: number): void {
  const [{ context }] = args as unknown as [{ context?: string }];
  if (level > 30 || !assembly.has(context ?? '')) log.apply(this, args);
}

/** Links carry secrets in their path, so whatever follows a token's place is left out. */
function requestFacts({ id, method, url }: { id: unknown; method: string; url: string }): object {
  const path = (url.split('?')[0] ?? '').replace(/\/(subscriptions|link)\/(?!confirm\b)[^/]+/, '/$1/…');
  return { id, method, path };
}

function levelOf(
  _: IncomingMessage,
  response: ServerResponse,
  error?: Error,
): 'info' | 'warn' | 'error' | 'debug' {
  if (error || response.statusCode >= 500) return 'error';
  return response.statusCode >= 400 ? 'warn' : 'debug';
}
