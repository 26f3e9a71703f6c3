/** For the shell: a single quote within single quotes. */
const quoted = (text: string): string => `'${text.replaceAll("'", "'\\''")}'`;

/**
 * A command with which a site can try its key: the answer says whether the key, the sensor's name and the time are
 * right. Its value is null, no reading, so that nothing untrue enters the record.
 */
export function curlExample(origin: string, key: string, sensor = 'SENSOR'): string {
  const time = `${new Date().toISOString().slice(0, 16)}:00Z`;
  const body = JSON.stringify({ readings: [{ time, sensor, value: null }] });
  return [
    `curl ${origin}/api/ingest/readings \\`,
    `  -H 'authorization: Bearer ${key}' \\`,
    `  -H 'content-type: application/json' \\`,
    `  -d ${quoted(body)}`,
  ].join('\n');
}

/** A command that packs a file of readings and pushes it. */
export function curlFileExample(origin: string, key: string): string {
  return [
    `gzip -c readings.csv | curl ${origin}/api/ingest/readings \\`,
    `  -H 'authorization: Bearer ${key}' \\`,
    `  -H 'content-type: text/csv' -H 'content-encoding: gzip' \\`,
    `  --data-binary @-`,
  ].join('\n');
}
