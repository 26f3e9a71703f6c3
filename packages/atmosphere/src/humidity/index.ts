export * from './over-ice';
