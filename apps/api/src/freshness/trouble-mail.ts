import type { TroubleKind } from './dto/trouble.dto';
import { minuteUtc } from './trouble-words';

/** A trouble as a mail tells it. */
export interface ToldTrouble {
  readonly id: number;
  readonly towerId: number;
  readonly towerName: string;
  readonly kind: TroubleKind;
  readonly text: string;
  readonly since: number;
  readonly endedAt: number | null;
}

const SHORT: Record<TroubleKind, string> = {
  late: 'is late',
  silent: 'is silent',
  'clock ahead': 'sends readings from the future',
  'clock shifted': 'has its clock an hour off',
  'source failing': 'has a source that fails',
};

const names = (troubles: readonly ToldTrouble[]): string[] => [
  ...new Set(troubles.map(({ towerName }) => towerName)),
];
const towersOf = (troubles: readonly ToldTrouble[]): string => {
  const all = names(troubles);
  return all.length <= 3 ? all.join(', ') : `${all.length} towers`;
};

function subjectOf(opened: readonly ToldTrouble[], over: readonly ToldTrouble[]): string {
  const [first] = opened;
  if (!first) return `${towersOf(over)}: the trouble is over`;
  return opened.length === 1
    ? `${first.towerName} ${SHORT[first.kind]}`
    : `${towersOf(opened)}: ${opened.length} troubles with the readings`;
}

/** One mail about everything that opened and everything that is over since the last. */
export function troubleMail(
  opened: readonly ToldTrouble[],
  over: readonly ToldTrouble[],
  publicUrl: string,
): { subject: string; text: string } {
  const page = (towerId: number) => `${publicUrl}/readings/towers/${towerId}`;
  const parts = [
    ...opened.map(({ text, since, towerId }) => `${text}\nSince ${minuteUtc(since)}.\n${page(towerId)}`),
    ...over.map(
      ({ towerName, kind, since, endedAt, towerId }) =>
        `Over: ${towerName} ${SHORT[kind]}, from ${minuteUtc(since)} to ${minuteUtc(endedAt!)}.\n${page(towerId)}`,
    ),
  ];
  const close =
    opened.length > 0
      ? 'Meanwhile what these towers would tell is not known. A notice in force stays until its written end; nothing begins or ends because a tower is silent.\n\nYou get this once for each trouble, because you are an analyst of this service.'
      : 'You get this because you were told of the trouble.';
  return { subject: subjectOf(opened, over), text: `${[...parts, close].join('\n\n')}\n` };
}
