/**
 * Sends a tower's file through the real way in of a service started for it, and holds what the service's API says
 * against a truth worked out elsewhere. Uses nothing of the product but its API. Ends with 1 when anything differs or
 * nothing was compared, with 2 when it could not be run.
 */
import { Client } from './verify-tower/client.mjs';
import { compare } from './verify-tower/compare.mjs';
import { readReadings, readTruth } from './verify-tower/files.mjs';
import { OptionError, readOptions } from './verify-tower/options.mjs';
import { holds, report } from './verify-tower/report.mjs';
import { startService } from './verify-tower/service.mjs';
import {
  makeTower,
  readProfiles,
  sendReadings,
  waitUntilWorkedOut,
} from './verify-tower/through-the-service.mjs';

async function verify(args) {
  const options = readOptions(args);
  const readings = await readReadings(options);
  const truth = await readTruth(options);
  const service = await startService();
  try {
    const client = new Client(service.url);
    const { towerId, key } = await makeTower(client, service.token, options);
    const sent = await sendReadings(client, key, readings);
    await waitUntilWorkedOut(client, towerId);
    const result = compare(truth, readings, await readProfiles(client, towerId), options);
    report(sent, result);
    return holds(result) ? 0 : 1;
  } finally {
    await service.close();
  }
}

try {
  process.exitCode = await verify(process.argv.slice(2));
} catch (error) {
  console.error(error instanceof OptionError ? error.message : error);
  process.exitCode = 2;
}
