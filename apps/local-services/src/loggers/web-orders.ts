import { BadOrder } from '../control/orders';

/** How the loggers' web server treats whoever asks for a file. */
export type WebMode = 'ok' | 'slow' | 'error' | 'busy' | 'redirect' | 'cut' | 'endless' | 'page';

/** What it asks for before it gives a file. */
export type WebAuth =
  { readonly username: string; readonly password: string } | { readonly token: string } | null;

/** The orders of the loggers' web server; changed by POST /control/loggers/web. */
export interface WebOrders {
  mode: WebMode;
  /** Pause before an answer in mode `slow`, ms. */
  delayMs: number;
  /** How many more requests the mode holds for; then `ok`. Undefined: until told otherwise. */
  times?: number;
  auth: WebAuth;
}

const MODES: readonly WebMode[] = ['ok', 'slow', 'error', 'busy', 'redirect', 'cut', 'endless', 'page'];
const LONGEST_DELAY_MS = 600_000;

/** Fresh orders: everybody gets every file. */
export const openToAll = (): WebOrders => ({ mode: 'ok', delayMs: 1000, auth: null });

const isCount = (value: unknown, highest: number): value is number =>
  typeof value === 'number' && value >= 0 && value <= highest;

/** Changes the orders: `{mode, delayMs, times, auth: {username, password} | {token} | null}`; what is left out stays. */
export function orderWeb(orders: WebOrders, body: Record<string, unknown>): WebOrders {
  const stranger = Object.keys(body).find((name) => !['mode', 'delayMs', 'times', 'auth'].includes(name));
  if (stranger) throw new BadOrder(`"${stranger}" is not an order. These are: mode, delayMs, times, auth.`);
  const { mode = orders.mode, delayMs = orders.delayMs, times, auth = orders.auth } = body;
  if (!MODES.includes(mode as WebMode)) throw new BadOrder(`"mode" is one of ${MODES.join(', ')}.`);
  if (!isCount(delayMs, LONGEST_DELAY_MS))
    throw new BadOrder(`"delayMs" is a number from 0 to ${LONGEST_DELAY_MS}.`);
  if (times !== undefined && !isCount(times, 1e9)) throw new BadOrder('"times" is a number from 0 up.');
  const known = readAuth(auth);
  Object.assign(orders, { mode, delayMs, auth: known, ...(body.mode !== undefined && { times }) });
  return orders;
}

function readAuth(auth: unknown): WebAuth {
  if (auth === null) return null;
  const { username, password, token } = auth as Record<string, unknown>;
  if (typeof token === 'string') return { token };
  if (typeof username === 'string' && typeof password === 'string') return { username, password };
  throw new BadOrder('"auth" is {"username", "password"}, {"token"}, or null.');
}

/** The Authorization header that opens the files; undefined where they are open to all. */
export function wantedHeader(auth: WebAuth): string | undefined {
  if (auth === null) return undefined;
  if ('token' in auth) return `Bearer ${auth.token}`;
  return `Basic ${Buffer.from(`${auth.username}:${auth.password}`).toString('base64')}`;
}
