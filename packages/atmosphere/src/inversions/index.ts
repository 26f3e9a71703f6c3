export * from './settings';
export { runsOf } from './runs';
export type { Run } from './runs';
export type { Inversion, OpenEnd } from './inversion';
export type { SurfaceFinding } from './surface-finding';
export type { ElevatedLid } from './elevated-lid';
export * from './find-inversions';
export * from './stable-depth';
export * from './floor-to-bench';
