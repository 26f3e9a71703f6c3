import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { configureApp } from './app.setup';
import { StartFault } from './common/start-fault';
import { Settings } from './config/settings';
import { feedDemo, wakeDemoLoggers } from './demo/feed-demo';

/**
 * Starts the service and listens. What can be cured from outside (a port in use, a folder that cannot be written, a
 * second process on the same folder) is told in one sentence on standard error, and the process ends with 1.
 */
export async function start(): Promise<NestExpressApplication | undefined> {
  try {
    return await listen();
  } catch (error) {
    if (error instanceof StartFault) process.stderr.write(`${error.message}\n`);
    else
      process.stderr.write(
        `Lidwatch could not start: ${error instanceof Error ? error.stack : String(error)}\n`,
      );
    process.exit(1);
  }
}

async function listen(): Promise<NestExpressApplication> {
  await feedDemo();
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    bodyParser: false,
    bufferLogs: true,
    autoFlushLogs: false,
    abortOnError: false,
  });
  app.useLogger(app.get(Logger));
  app.flushLogs();
  const settings = app.get(Settings);
  configureApp(app);
  app.enableShutdownHooks(['SIGINT', 'SIGTERM']);
  try {
    await app.listen(settings.port);
  } catch (error) {
    throw (error as NodeJS.ErrnoException).code === 'EADDRINUSE' ? portInUse(settings.port) : error;
  }
  await wakeDemoLoggers(settings);
  app.get(Logger).log(`Listening at ${await app.getUrl()} for ${settings.publicUrl}`, 'Start');
  return app;
}

function portInUse(port: number): StartFault {
  return new StartFault(`Port ${port} is in use: stop what listens there, or set PORT to another one.`);
}
