export { LiveLoggers } from './live-loggers';
export { loggerWeb } from './logger-web';
export { loggersRouter } from './loggers-router';
export { openToAll } from './web-orders';
