const SESSION_ENDED = 'session-ended';

/** Tells the page that the service no longer knows who is asking. */
export function announceSessionEnded(): void {
  window.dispatchEvent(new Event(SESSION_ENDED));
}

/** Calls back each time the session is found to have ended; returns how to stop. */
export function onSessionEnded(tell: () => void): () => void {
  window.addEventListener(SESSION_ENDED, tell);
  return () => window.removeEventListener(SESSION_ENDED, tell);
}
