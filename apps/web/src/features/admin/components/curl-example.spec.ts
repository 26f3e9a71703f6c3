import { spawnSync } from 'node:child_process';
import { curlExample, curlFileExample } from './curl-example';

/** What a shell hands to curl. */
const argumentsOf = (command: string): string[] => {
  const script = `curl() { printf '%s\\n' "$@"; }\ngzip() { :; }\n${command}`;
  return spawnSync('sh', ['-c', script], { encoding: 'utf8' }).stdout.split('\n').filter(Boolean);
};

describe('the commands to try a key with', () => {
  it('reach curl as they are meant, whatever the sensor is called', () => {
    const found = argumentsOf(curlExample('https://air.example.org', 'site-abc', `it's "2 m" $HOME`));
    expect(found.slice(0, 6)).toEqual([
      'https://air.example.org/api/ingest/readings',
      '-H',
      'authorization: Bearer site-abc',
      '-H',
      'content-type: application/json',
      '-d',
    ]);
    expect(JSON.parse(found[6]!)).toEqual({
      readings: [
        {
          time: expect.stringMatching(/^\d{4}-\d\d-\d\dT\d\d:\d\d:00Z$/),
          sensor: `it's "2 m" $HOME`,
          value: null,
        },
      ],
    });
  });

  it('pack a file on the way', () => {
    const found = argumentsOf(curlFileExample('https://air.example.org', 'site-abc'));
    expect(found.slice(-3)).toEqual(['content-encoding: gzip', '--data-binary', '@-']);
  });
});
