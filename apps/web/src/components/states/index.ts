export * from './empty';
export * from './failed';
export * from './loaded';
export * from './loading';
export * from './stale';
export * from './refusal';
