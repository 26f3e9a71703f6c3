import * as store from './0001-store';
import * as waysIn from './0002-ways-in';

/** A step of the store's schema: its name for ever and its statements in order. */
export interface Migration {
  name: string;
  up: readonly string[];
}

/** Every migration in order; written out, because file names differ between source and build. */
export const migrations: readonly Migration[] = [store, waysIn];
