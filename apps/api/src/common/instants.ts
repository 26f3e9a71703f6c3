/** An instant in UTC epoch seconds as ISO 8601 text with the offset Z, whole seconds. */
export function toIso(epochS: number): string {
  return new Date(epochS * 1000).toISOString().replace('.000Z', 'Z');
}

/** The UTC epoch seconds of ISO 8601 text that carries its offset; undefined when it does not or is no instant. */
export function fromIso(text: string): number | undefined {
  if (!/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:?\d{2})$/.test(text)) return undefined;
  const ms = Date.parse(text);
  return Number.isNaN(ms) ? undefined : Math.floor(ms / 1000);
}
