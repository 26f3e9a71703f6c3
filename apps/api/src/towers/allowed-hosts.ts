/** The port of an address, the scheme's usual one where none is written. */
const portOf = ({ protocol, port }: URL): string => port || (protocol === 'https:' ? '443' : '80');

/**
 * Whether an address may be asked: its host, and its port where the list names one, stands in the list. An entry without
 * a port means the usual port of http and of https.
 *
 * The list is the administrator's own choice, name by name, so what a listed name resolves to is not looked at: loggers
 * often stand in the same private network.
 */
export function isAllowed(url: URL, hosts: readonly string[]): boolean {
  const usual = url.port === '';
  return hosts.some((host) => (usual && host === url.hostname) || host === `${url.hostname}:${portOf(url)}`);
}

/** Why an address is not asked, and the cure. */
export const notAllowed = ({ host }: URL): string =>
  `The service may not ask ${host}. Whoever runs it can allow that: add ${host} to HTTP_SOURCE_HOSTS and start it again.`;
