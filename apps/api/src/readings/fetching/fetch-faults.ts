import { SourceFault } from '../collector/source-fault';

const LONGEST_RETRY_AFTER_S = 86_400;

/** Seconds of a Retry-After header (RFC 9110 section 10.2.3), in seconds or as a date; undefined without a usable one. */
export function retryAfterS(header: string | null, nowMs: number): number | undefined {
  if (header === null) return undefined;
  const seconds = /^\d+$/.test(header) ? Number(header) : (Date.parse(header) - nowMs) / 1000;
  return seconds > 0 ? Math.min(Math.ceil(seconds), LONGEST_RETRY_AFTER_S) : undefined;
}

const BY_STATUS: Readonly<Record<number, string>> = {
  401: 'It asks for other credentials (401). Enter the right ones.',
  403: 'It refuses these credentials (403). Ask whoever runs it for access.',
  404: 'There is nothing at this address (404). Look at the address, and whether the logger sends its file there.',
  407: 'A proxy in between asks for credentials (407). Ask whoever runs the network.',
  410: 'What was at this address is gone (410). Ask whoever runs it for the new one.',
  429: 'It is asked too often (429). Choose a longer interval.',
};

/** Why an answer with an error status gave nothing. */
export function statusFault(
  host: string,
  status: number,
  retryAfter: string | null,
  nowMs: number,
): SourceFault {
  const why =
    BY_STATUS[status] ??
    (status >= 500
      ? `It has a fault of its own (${status}). If it stays, tell whoever runs it.`
      : `It answered ${status} instead of the file. Look at the address.`);
  const pause = retryAfterS(retryAfter, nowMs);
  return new SourceFault(`${host}: ${why}`, pause === undefined ? {} : { retryAfterS: pause });
}

const BY_CODE: readonly [RegExp, string][] = [
  [/^(ENOTFOUND|EAI_AGAIN)$/, 'Its name is not known. Look at the address, and at the name service.'],
  [/^ECONNREFUSED$/, 'Nothing listens there. Look whether its server runs, and at the port.'],
  [
    /^(ENETUNREACH|EHOSTUNREACH|ETIMEDOUT|UND_ERR_CONNECT_TIMEOUT)$/,
    'It cannot be reached. Look at the connection.',
  ],
  [/^CERT_HAS_EXPIRED$/, 'Its certificate has expired. Whoever runs it has to renew it.'],
  [/^ERR_TLS_CERT_ALTNAME_INVALID$/, 'Its certificate is for another name. Look at the address.'],
  [
    /CERT|SIGNATURE|SELF_SIGNED|ERR_SSL|EPROTO/,
    'No secure connection came about. Look whether it is http or https, and at its certificate.',
  ],
  [
    /^(ECONNRESET|EPIPE|UND_ERR_SOCKET|UND_ERR_RES_CONTENT_LENGTH_MISMATCH|ERR_STREAM_PREMATURE_CLOSE)$/,
    'The connection broke before the whole file had come. Nothing of it was taken.',
  ],
  [
    /^(Z_|ERR_)?.*(Z_DATA_ERROR|Z_BUF_ERROR|Z_MEM_ERROR)$/,
    'The compressed file is damaged or cut off. Nothing of it was taken.',
  ],
  [
    /^(HPE_|UND_ERR_(HEADERS_OVERFLOW|RES))/,
    'What it answers is not HTTP. Look at the address and the port.',
  ],
];

interface Cause {
  readonly code?: unknown;
  readonly message?: unknown;
}

/** Why no whole answer came, from what the connection's own error says; undefined for a fault of the service. */
export function connectionFault(host: string, error: unknown): SourceFault | undefined {
  const causes = causesOf(error);
  for (const { code } of causes) {
    const found = BY_CODE.find(([pattern]) => typeof code === 'string' && pattern.test(code));
    if (found) return new SourceFault(`${host}: ${found[1]}`);
  }
  if (!causes.some(({ message }) => message === 'fetch failed' || message === 'terminated')) return undefined;
  // Such as "bad port": ports of other services are never asked (Fetch Standard, section 2.9).
  return new SourceFault(`${host}: It could not be asked (${causes[0]?.message}). Look at the address.`);
}

/** An error and what caused it, the innermost first. */
function causesOf(error: unknown): Cause[] {
  const chain: Cause[] = [];
  let at = error as (Cause & { cause?: unknown; errors?: Cause[] }) | undefined;
  while (typeof at === 'object' && at !== null && chain.length < 5) {
    chain.unshift(...(at.errors ?? []), at);
    at = at.cause as typeof at;
  }
  return chain;
}
