export * from './block-mean';
export * from './hour-mean';
export * from './direction-mean';
