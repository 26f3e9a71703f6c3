import type { FieldError } from '@lidwatch/contracts';
import { invalid } from '../common/validation';
import { isAllowed, notAllowed } from './allowed-hosts';
import type { MappingInput } from './dto/mapping.dto';
import type { Auth, SourceInput, SourceKind } from './dto/source-input.dto';
import { sealCredentials, type Credentials } from './source-secrets';

/** What a person sets of a source, as it is kept. */
export interface SourceValues {
  readonly kind: SourceKind;
  readonly path: string | null;
  readonly url: string | null;
  readonly auth: Auth;
  readonly secret: string | null;
  /** JSON. */
  readonly mapping: string;
  readonly intervalS: number;
}

/** What sources are checked against and sealed with. */
export interface Surroundings {
  readonly hosts: readonly string[];
  readonly secret: string;
}

type Given = Omit<SourceInput, 'kind'>;

const USUAL_INTERVAL_S: Readonly<Record<SourceKind, number>> = { folder: 60, http: 300, push: 60 };
/** Other people's servers are not asked more often than this, s. */
const LEAST_HTTP_INTERVAL_S = 60;

const fault = (field: string, text: string): never => {
  throw invalid([{ field, text }]);
};

/**
 * The settings of a new source, or of a known one with what a change gives of them.
 *
 * @throws Problem `invalid`, each fault beside its field
 */
export function sourceValues(
  kind: SourceKind,
  given: Given,
  before: SourceValues | undefined,
  around: Surroundings,
): SourceValues {
  refuseStrangers(kind, given);
  const mapping: MappingInput = given.mapping ?? (before ? (JSON.parse(before.mapping) as MappingInput) : {});
  const intervalS = given.intervalSeconds ?? before?.intervalS ?? USUAL_INTERVAL_S[kind];
  const common = { kind, mapping: JSON.stringify(mapping), intervalS };
  const none = { path: null, url: null, auth: 'none', secret: null } as const;
  if (kind === 'push') return { ...common, ...none };
  if (kind === 'folder') {
    const path =
      given.path ?? before?.path ?? fault('path', "Name a file or folder beneath the loggers' folder.");
    return { ...common, ...none, path };
  }
  if (intervalS < LEAST_HTTP_INTERVAL_S)
    fault('intervalSeconds', `Over HTTP look every ${LEAST_HTTP_INTERVAL_S} s or less often.`);
  const url = readAddress(given.url ?? before?.url ?? '', around.hosts);
  return { ...common, path: null, url: url.href, ...credentialsOf(given, before, url, around.secret) };
}

const HTTP_ONLY = ['url', 'auth', 'username', 'password', 'token'] as const;

function refuseStrangers(kind: SourceKind, given: Given): void {
  const errors: FieldError[] = [];
  if (kind !== 'http') {
    const strangers = HTTP_ONLY.filter((field) => given[field] !== undefined);
    errors.push(
      ...strangers.map((field) => ({ field, text: 'This belongs to sources over HTTP. Leave it out.' })),
    );
  }
  if (kind !== 'folder' && given.path !== undefined)
    errors.push({ field: 'path', text: 'This belongs to sources in a folder. Leave it out.' });
  if (errors.length > 0) throw invalid(errors);
}

function readAddress(text: string, hosts: readonly string[]): URL {
  if (!/^https?:\/\//i.test(text) || !URL.canParse(text))
    return fault('url', 'Write the whole address, such as https://loggers.example.org/mast.csv.');
  const url = new URL(text);
  if (url.username || url.password)
    return fault('url', 'Leave the name and the password out of the address. They have fields of their own.');
  url.hash = '';
  return isAllowed(url, hosts) ? url : fault('url', notAllowed(url));
}

function credentialsOf(
  given: Given,
  before: SourceValues | undefined,
  url: URL,
  secret: string,
): Pick<SourceValues, 'auth' | 'secret'> {
  const auth = given.auth ?? before?.auth ?? 'none';
  const typed = typedCredentials(auth, given);
  if (auth === 'none') return { auth, secret: null };
  if (typed) return { auth, secret: sealCredentials(secret, url.origin, typed) };
  const kept = before?.auth === auth ? before.secret : null;
  const field = auth === 'basic' ? 'password' : 'token';
  if (!kept) return fault(field, `Enter the ${auth === 'basic' ? 'name and the password' : 'token'}.`);
  if (new URL(before!.url!).origin !== url.origin)
    return fault(
      field,
      'The address leads to another place. Enter the credentials for it; the former are not sent there.',
    );
  return { auth, secret: kept };
}

/** The credentials that were typed; undefined where none were. Half of them, or those of another kind, are refused. */
function typedCredentials(auth: Auth, { username, password, token }: Given): Credentials | undefined {
  if (auth !== 'basic' && (username !== undefined || password !== undefined))
    fault('auth', 'A name and a password go with "basic". Choose it, or leave them out.');
  if (auth !== 'bearer' && token !== undefined)
    fault('auth', 'A token goes with "bearer". Choose it, or leave the token out.');
  if (auth === 'bearer') return token === undefined ? undefined : { auth, token };
  if (auth === 'none' || (username === undefined && password === undefined)) return undefined;
  if (username === undefined) return fault('username', 'Enter the name that goes with the password.');
  if (password === undefined) return fault('password', 'Enter the password that goes with the name.');
  return { auth, username, password };
}
