/** Why a time stamp cannot be used. */
export interface TimeRefusal {
  readonly code:
    'time-not-readable' | 'time-not-plausible' | 'time-ahead' | 'time-happens-twice' | 'time-does-not-exist';
  /** What is wrong, then the cure. */
  readonly why: string;
}
