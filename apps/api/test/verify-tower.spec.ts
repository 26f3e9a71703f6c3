import { execFile } from 'node:child_process';
import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

const root = path.resolve(__dirname, '../../..');
const tower = path.join(root, 'fixtures/readings/tower');
const LEVELS = [2, 10, 30, 60, 100].flatMap((heightM) => ['--level', `${heightM}=Air, ${heightM} m`]);
const OPTIONS = [
  '--time',
  'Time, local',
  '--block',
  '15',
  '--offset',
  '-07:00',
  '--missing',
  '-999',
  ...LEVELS,
];

/** Runs the script on the built service; the answers of an invented tower, worked out by hand-made arithmetic. */
function verify(truth: string): Promise<{ code: number; output: string }> {
  const script = path.join(root, 'scripts/verify-tower.mjs');
  const files = ['--readings', path.join(tower, 'readings.csv'), '--truth', truth];
  return new Promise((resolve) => {
    execFile(process.execPath, [script, ...files, ...OPTIONS], { cwd: root }, (error, stdout, stderr) => {
      resolve({ code: error ? Number(error.code) : 0, output: stdout + stderr });
    });
  });
}

describe('npm run verify:tower', () => {
  it('holds on a tower with gaps, an absurd value, an off-grid and a repeated stamp, in any order', async () => {
    const { code, output } = await verify(path.join(tower, 'truth.csv'));
    expect(output).toContain('HOLDS: every compared value agrees.');
    expect(output).toContain('Columns passed over: battery (V)');
    expect(output).toMatch(/1 × time-not-readable/);
    expect(output).toMatch(/Stamps compared: 57; passed over .*: 3\./);
    expect(code).toBe(0);
  }, 120_000);

  it('does not hold where one lapse rate of the truth is off by a little', async () => {
    const wrong = path.join(tmpdir(), `lidwatch-truth-${process.pid}.csv`);
    const truth = readFileSync(path.join(tower, 'truth.csv'), 'utf8').split('\n');
    const at = truth.findIndex((line) => /Z,[^,]+,-?\d/.test(line));
    truth[at] = truth[at]!.replace(/^([^,]+,[^,]+,)(-?[\d.]+)/, (_, before: string, rate: string) => {
      return `${before}${(Number(rate) + 0.002).toFixed(4)}`;
    });
    writeFileSync(wrong, truth.join('\n'));
    const { code, output } = await verify(wrong);
    rmSync(wrong);
    expect(output).toContain('DOES NOT HOLD: 1 values differ.');
    expect(output).toMatch(/DIFFERS .* gamma_2_10: truth .*, service /);
    expect(code).toBe(1);
  }, 120_000);
});
