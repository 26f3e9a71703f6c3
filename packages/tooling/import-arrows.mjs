/** Refuses imports whose path matches one of the patterns. */
const refuse = (files, patterns, ignores = []) => ({
  files,
  ignores,
  rules: { 'no-restricted-imports': ['error', { patterns }] },
});

const spec = ['**/*.spec.ts', '**/*.testing.ts', '**/src/testing/**'];
const node = { regex: '^node:', message: 'The packages are pure: no files, no network, no clock.' };
const ours = (names, message) => ({ regex: `^@lidwatch/(?:${names.join('|')})$`, message });

/** Which package may look into which. */
export const packageArrows = [
  refuse(
    ['packages/atmosphere/src/**'],
    [node, { regex: '^@lidwatch/', message: 'atmosphere imports nothing of ours.' }],
    spec,
  ),
  refuse(
    ['packages/rules/src/**'],
    [node, ours(['contracts', 'api'], 'rules imports atmosphere only.')],
    spec,
  ),
  refuse(
    ['packages/contracts/src/**'],
    [node, { regex: '^@lidwatch/', message: 'contracts imports nothing of ours.' }],
    spec,
  ),
  refuse(
    ['apps/local-services/src/**'],
    [{ regex: '^@lidwatch/', message: 'The stand-ins share no code with what they stand in front of.' }],
    spec,
  ),
];

/** The rooms of the server, floor by floor: a room imports rooms of its own floor and of the floors above it here. */
const FLOORS = [
  ['common', 'config'],
  ['compute', 'database', 'http'],
  ['scheduler', 'activity'],
  ['outbox'],
  ['users', 'auth'],
  ['rework'],
  ['office', 'towers', 'districts'],
  ['readings', 'screening', 'profiles'],
  ['forecasts'],
  ['rules'],
  ['subscribers', 'notices', 'freshness'],
  ['proposals'],
  ['delivery', 'desk', 'public-status', 'health'],
  ['demo'],
];

/** The rooms a file of a room may not look into: those of the floors below its own. */
export const apiArrows = FLOORS.flatMap((rooms, floor) => {
  const below = FLOORS.slice(floor + 1).flat();
  if (below.length === 0) return [];
  const message = `This room stands above: it must not know ${below.join(', ')}.`;
  const pattern = { regex: `^(?:\\.\\./)+(?:${below.join('|')})(?:/|$)`, message };
  return rooms.map((room) => refuse([`apps/api/src/${room}/**/*.ts`], [pattern], spec));
});

/** The list of addresses, `app/paths`, is for everybody. */
const above = (names, message) => ({
  regex: `^(?:\\.\\./)+(?:${names.join('|')})(?:/(?!paths$)|$)`,
  message,
});

/** Web: shared ← features ← pages ← app; a feature never imports another. */
export const webArrows = [
  refuse(
    ['apps/web/src/{components,lib,theme}/**'],
    [above(['features', 'pages', 'app'], 'Shared parts know no feature, page or app.')],
    ['**/*.spec.*'],
  ),
  refuse(
    ['apps/web/src/features/**'],
    [
      above(['pages', 'app'], 'A feature knows no page and no app.'),
      {
        regex: '^(?:\\.\\./){1,2}(?!\\.\\./)(?!components/|api$|api/|hooks/|lib/)[a-z-]+/components/',
        message: 'A feature never imports another feature.',
      },
    ],
    ['**/*.spec.*'],
  ),
  refuse(
    ['apps/web/src/pages/**'],
    [above(['app'], 'A page does not know the app around it.')],
    ['**/*.spec.*'],
  ),
];
