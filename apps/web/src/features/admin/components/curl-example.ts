/**
 * A command with which a site can try its key: it pushes one reading, and a real one, so that the answer says whether
 * the sensor's name is right.
 */
export function curlExample(origin: string, key: string, sensor = 'SENSOR'): string {
  const time = `${new Date().toISOString().slice(0, 16)}:00Z`;
  const body = JSON.stringify({ readings: [{ time, sensor, value: -3.2 }] });
  return [
    `curl ${origin}/api/ingest/readings \\`,
    `  -H 'authorization: Bearer ${key}' \\`,
    `  -H 'content-type: application/json' \\`,
    `  -d '${body.replaceAll("'", "'\\''")}'`,
  ].join('\n');
}
