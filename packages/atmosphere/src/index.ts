export * from './bounds';
export * from './constants';
export * from './units';
export * from './temperature';
export * from './uncertainty';
export * from './profile';
export * from './inversions';
