export * from './normal';
export * from './data-sheet';
