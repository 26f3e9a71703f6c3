export * from './potential-temperature';
export * from './hydrostatic';
export * from './standard-atmosphere';
export * from './saturation';
export * from './moist-lapse-rate';
