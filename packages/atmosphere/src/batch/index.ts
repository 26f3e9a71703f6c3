export { batchResult, NO_CLASS, OPEN_CODES, SURFACE_CODES } from './profiles';
export type { BatchResult, ProfileBatch } from './profiles';
export { analyseBatch } from './analyse-batch';
