import { nextStep } from './history-steps';

const at = (iso: string): number => Date.parse(iso) / 1000;
const NOW = at('2026-12-01T06:00:00Z');

/** Every step of a day. */
function stepsFrom(iso: string, quiet: boolean): string[] {
  const steps: string[] = [];
  for (let t = at(iso); t < at(iso) + 86_400;) {
    t = nextStep(t, NOW, quiet);
    steps.push(new Date(t * 1000).toISOString().slice(11, 13));
  }
  return steps;
}

test('a day is looked at six times, and four times while all is quiet', () => {
  expect(stepsFrom('2026-01-10T03:00:00Z', false)).toEqual(['08', '14', '18', '19', '22', '03']);
  expect(stepsFrom('2026-01-10T03:00:00Z', true)).toEqual(['14', '19', '22', '03']);
});

test('the last three days are looked at every hour', () => {
  expect(stepsFrom('2026-11-29T03:00:00Z', true)).toHaveLength(24);
});
