import path from 'node:path';
import { LiveLoggers, loggersRouter, loggerWeb, openToAll } from './loggers';
import { startLocalServices } from './local-services';
import { readSettings } from './settings';

const inPlainWords = (error: NodeJS.ErrnoException & { port?: number }): string =>
  error.code === 'EADDRINUSE'
    ? `Port ${error.port} is in use. Stop what uses it, or choose another by LOCAL_PAGE_PORT, LOCAL_SMTP_PORT or LOCAL_SMS_PORT.`
    : error.message;

const main = async (): Promise<void> => {
  const settings = readSettings(process.env);
  const stateFile = path.join(settings.stateDir, 'loggers.json');
  const loggers = new LiveLoggers({ loggerDir: settings.loggerDir, stateFile }, () => Date.now() / 1000);
  const web = openToAll();
  const services = await startLocalServices(settings, [
    ['/control/loggers', loggersRouter(loggers, web)],
    ['/loggers', loggerWeb(settings.loggerDir, web)],
  ]);
  console.log(
    `Local services: page http://127.0.0.1:${services.pagePort}, mail 127.0.0.1:${services.smtpPort}, texts http://127.0.0.1:${services.smsPort}, loggers' files http://127.0.0.1:${services.pagePort}/loggers/`,
  );
  const stop = () => void Promise.all([loggers.close(), services.close()]).then(() => process.exit(0));
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
};

main().catch((error: NodeJS.ErrnoException) => {
  console.error(inPlainWords(error));
  process.exit(1);
});
