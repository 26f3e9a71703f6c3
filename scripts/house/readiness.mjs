const ASK_FOR_MS = 2_000;

/**
 * Asks a program whether it is ready. While the demo is fed in, the server answers 503 with how far it is.
 *
 * @returns {Promise<{ready: boolean, progress?: string}>}
 */
export async function readinessOf(url) {
  try {
    const response = await fetch(url, { signal: AbortSignal.timeout(ASK_FOR_MS) });
    if (response.ok) return { ready: true };
    const body = await response.json();
    return { ready: false, progress: typeof body.progress === 'string' ? body.progress : undefined };
  } catch {
    // It does not listen yet, or is too busy to answer: ask again.
    return { ready: false };
  }
}
