export * from './combine';
