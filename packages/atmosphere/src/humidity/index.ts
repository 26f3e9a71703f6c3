export * from './vapour-pressure';
export * from './over-ice';
export * from './dew-point';
export * from './content';
export * from './wet-bulb';
export * from './humidity';
