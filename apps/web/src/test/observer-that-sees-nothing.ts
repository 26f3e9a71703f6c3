/** Stands for ResizeObserver and IntersectionObserver where nothing has a size: accepts every call, reports nothing. */
export class ObserverThatSeesNothing {
  readonly root = null;
  readonly rootMargin = '';
  readonly thresholds: readonly number[] = [];
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
  takeRecords(): [] {
    return [];
  }
}
