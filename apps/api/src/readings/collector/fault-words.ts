import { Problem } from '../../common/problem';
import { NotTextError } from '../parse/decode-text';
import { HeaderError } from '../parse/parsed-readings';
import { SourceFault } from './source-fault';

/**
 * A fault of a file or a source as a sentence; undefined where the fault is the service's own. `name` is the file's, for
 * faults that do not say it themselves.
 */
export function faultWords(error: unknown, name: string): string | undefined {
  if (error instanceof SourceFault) return error.message;
  if (error instanceof HeaderError || error instanceof NotTextError) return `${name}: ${error.message}`;
  if (error instanceof Problem) return `${name}: ${error.detail}`;
  const { code, syscall } = error as NodeJS.ErrnoException;
  if (code === undefined || syscall === undefined) return undefined;
  return `${name} cannot be read (${code}). Look at the file's rights and the connection.`;
}
