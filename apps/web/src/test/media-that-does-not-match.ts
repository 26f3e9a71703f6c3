/** A media query that never matches: light scheme, wide screen, movement allowed. */
export function mediaThatDoesNotMatch(media: string): MediaQueryList {
  return Object.assign(new EventTarget(), {
    media,
    matches: false,
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
  });
}
