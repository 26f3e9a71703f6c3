export * from './profiles';
export { smallExp } from './small-exp';
export * from './analyse-batch';
