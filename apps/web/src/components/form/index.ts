export * from './checks-entry';
export * from './choice-entry';
export * from './entry-form';
export * from './entry-grid';
export * from './number-entry';
export * from './text-entry';
