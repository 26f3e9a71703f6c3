export * from './settings';
export * from './step';
export * from './live-duration';
export type { Episode } from './summary';
export * from './episodes';
