import type { SignedIn } from '../signed-in';

/** Who a session belongs to: the account and the number its sessions are made under. */
export interface SessionOwner {
  id: number;
  epoch: number;
}

/** What a session keeps besides its cookie. Instants are UTC epoch seconds. */
export interface SessionFacts {
  passport?: { user?: SessionOwner };
  signedInAt?: number;
  /** The last request, to the minute. */
  seenAt?: number;
}

declare module 'express-session' {
  interface SessionData {
    passport?: { user?: SessionOwner };
    signedInAt?: number;
    seenAt?: number;
  }
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- how Express lets its request be extended
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- the person is the whole of it
    interface User extends SignedIn {}
  }
}
