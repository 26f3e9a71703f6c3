export { LiveLoggers } from './live-loggers';
export { loggersRouter } from './loggers-router';
