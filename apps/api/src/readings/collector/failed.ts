import type { Logger } from '@nestjs/common';
import type { Collected } from '../../towers/next-turn';
import { faultWords } from './fault-words';
import { SourceFault } from './source-fault';

const OUR_OWN = 'was not taken in, by a fault of the service. The log says more.';

/** A collection that failed, in words. A fault of the service itself is logged, and does not hold up other sources. */
export function failed(error: unknown, name: string, logger: Logger): Collected {
  const words = faultWords(error, name);
  if (words === undefined) logger.error(error);
  const result = words ?? `${name} ${OUR_OWN}`;
  if (!(error instanceof SourceFault)) return { result, failed: true };
  return { result, failed: true, retryAfterS: error.retryAfterS, notThereYet: error.notThereYet };
}
