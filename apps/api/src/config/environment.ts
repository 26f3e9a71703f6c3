import { StartFault } from '../common/start-fault';

/** Looks up one environment variable by name. */
export type Lookup = (name: string) => string | undefined;

/** Whether a text is a host with or without a port, and nothing else (no scheme, account, path or wildcard). */
const isHost = (text: string): boolean =>
  /^([a-z0-9.-]+|\[[0-9a-f:.]+\])(:\d{1,5})?$/.test(text) && URL.canParse(`http://${text}`);

/** Reads environment variables by kind; each fault is a sentence with the variable's name and what it should be. */
export class Environment {
  constructor(private readonly lookup: Lookup) {}

  /** The text of a variable, undefined when unset or blank. */
  text(name: string): string | undefined {
    const value = this.lookup(name)?.trim();
    return value === '' ? undefined : value;
  }

  /** A whole number within bounds, or the default when unset. */
  wholeNumber(name: string, fallback: number, least: number, most: number): number {
    const text = this.text(name);
    if (text === undefined) return fallback;
    const value = Number(text);
    if (Number.isInteger(value) && value >= least && value <= most) return value;
    throw new StartFault(`${name} is "${text}": set it to a whole number from ${least} to ${most}.`);
  }

  /** True for on, false for off, or the default when unset. */
  onOrOff(name: string, fallback: boolean): boolean {
    const text = this.text(name)?.toLowerCase();
    if (text === undefined) return fallback;
    if (text === 'on' || text === 'off') return text === 'on';
    throw new StartFault(`${name} is "${text}": set it to on or off.`);
  }

  /** An http or https address without a trailing slash, or undefined when unset. */
  webAddress(name: string): string | undefined {
    const text = this.text(name);
    if (text === undefined) return undefined;
    if (/^https?:\/\/[^\s/]+/.test(text) && URL.canParse(text)) return text.replace(/\/+$/, '');
    throw new StartFault(`${name} is "${text}": set it to an address such as https://air.example.org.`);
  }

  /** A comma-separated list of `host` or `host:port`, in lower case; empty when unset. */
  hosts(name: string): string[] {
    const entries = (this.text(name) ?? '').toLowerCase().split(',');
    const hosts = entries.map((entry) => entry.trim()).filter((entry) => entry !== '');
    const wrong = hosts.find((host) => !isHost(host));
    if (wrong === undefined) return hosts;
    throw new StartFault(
      `${name} has "${wrong}": write each as host or host:port, such as loggers.example.org:8080, with commas between.`,
    );
  }

  /** The values of variables that are only of use together: all of them, or undefined when none is set. */
  together<Name extends string>(...names: Name[]): Record<Name, string> | undefined {
    const found = names.map((name) => [name, this.text(name)] as const);
    const missing = found.filter(([, value]) => value === undefined).map(([name]) => name);
    if (missing.length === names.length) return undefined;
    if (missing.length > 0)
      throw new StartFault(`${names.join(', ')} belong together: set ${missing.join(' and ')} too.`);
    return Object.fromEntries(found) as Record<Name, string>;
  }
}
