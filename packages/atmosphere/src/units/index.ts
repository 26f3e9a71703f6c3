export * from './temperature';
export * from './lapse-rate';
export * from './pressure';
export * from './motion';
export * from './heat';
