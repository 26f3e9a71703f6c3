export * from './bounds';
