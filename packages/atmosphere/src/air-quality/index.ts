export * from './truncate';
export * from './aqi';
export * from './nowcast';
export * from './day-mean';
