import type { RefusedRow } from '../refusal';

/** The ways in for readings. */
export const originKinds = ['folder', 'push', 'http', 'upload', 'demo'] as const;

/** Where readings came from. */
export interface Origin {
  readonly origin: (typeof originKinds)[number];
  /** File name, key name, or the like. */
  readonly name: string;
  /** Rows that were refused while reading; they are kept with their reasons. */
  readonly refused?: readonly RefusedRow[];
  /** Of the whole file, where it is known. */
  readonly sha256?: string;
  /** Who sent it, where a person did. */
  readonly byUser?: number;
  /** The source it was collected from. */
  readonly sourceId?: number;
}

/** How many rows of an import went which way. */
export interface Counts {
  readonly new: number;
  readonly repeated: number;
  readonly corrected: number;
  readonly refused: number;
}

/** What taking readings in gave. */
export interface Ingested extends Counts {
  readonly importId: number;
}

/** Counts before anything came. */
export const NOTHING_COUNTED: Counts = { new: 0, repeated: 0, corrected: 0, refused: 0 };

/** Two counts together. */
export const sumOf = (a: Counts, b: Counts): Counts => ({
  new: a.new + b.new,
  repeated: a.repeated + b.repeated,
  corrected: a.corrected + b.corrected,
  refused: a.refused + b.refused,
});
