import type { ScreeningContext } from '@lidwatch/atmosphere';
import { computeTask } from '../compute/compute-task';
import { blockEndOf, type LayoutSensor, type TowerLayout } from '../towers/tower-layout';
import { blockMean, type BlockMean } from './block-means';
import { kinOf, screenStretch } from './screen-tower';
import { firstAfter, type ChangedFlag, type Flags, type Series, type SetSpan, type Stretch } from './series';

/** Blocks of one tower that are screened together. */
export interface Part {
  readonly tower: TowerLayout;
  readonly neighbours: readonly TowerLayout[];
  readonly stretch: Stretch;
  /** Ends of the blocks that changed. */
  readonly blocks: readonly number[];
  readonly context: ScreeningContext;
}

/** What screening a part found. */
export interface Found {
  readonly flags: ChangedFlag[];
  readonly means: BlockMean[];
}

/** Parts with the series of each in the order of `sensorsHeard`, and what people have set about them. */
export interface PartsToScreen {
  readonly parts: readonly Part[];
  readonly series: readonly Series[];
  readonly spans: readonly SetSpan[];
}

/** The readings whose flags a change within the part can alter, whole blocks of them. */
export const reachOf = ({ tower, stretch, context }: Part): Stretch => ({
  t0: blockEndOf(stretch.t0 - context.afterS, tower.blockS) - tower.blockS,
  t1: blockEndOf(stretch.t1 + context.beforeS, tower.blockS),
});

/** Whose readings a part's screening looks at: the tower's, then its neighbours'. */
export const sensorsHeard = ({ tower, neighbours }: Part): LayoutSensor[] => [
  ...tower.sensors,
  ...neighbours.flatMap((neighbour) => kinOf(tower, neighbour)),
];

/** Screens parts: the flags that changed, and the means of the blocks that changed or hold such a flag. */
export function screenParts({ parts, series, spans }: PartsToScreen): Found[] {
  let at = 0;
  return parts.map((part) => screenPart(part, series.slice(at, (at += sensorsHeard(part).length)), spans));
}

/** Screening parts, for the compute thread. */
export const screenPartsTask = computeTask(__filename, screenParts);

function screenPart(part: Part, all: readonly Series[], spans: readonly SetSpan[]): Found {
  const { tower, neighbours, blocks } = part;
  const series = all.slice(0, tower.sensors.length);
  let at = series.length;
  const nearby = neighbours.map((neighbour) => ({
    tower: neighbour,
    series: all.slice(at, (at += kinOf(tower, neighbour).length)),
  }));
  const flags = screenStretch(tower, series, reachOf(part), spans, nearby);
  const changed = series.flatMap((each, i) => changedFlags(each, flags[i]!));
  const ends = new Set([...blocks, ...changed.map(({ tEnd }) => blockEndOf(tEnd, tower.blockS))]);
  const means = tower.sensors.flatMap((sensor, i) =>
    [...ends].flatMap((tEnd) => blockMean(tower, sensor, series[i]!, flags[i]!, tEnd) ?? []),
  );
  return { flags: changed, means };
}

function changedFlags(series: Series, flags: Flags): ChangedFlag[] {
  if (flags.tEnd.length === 0) return [];
  const shift = firstAfter(series.tEnd, flags.tEnd[0]! - 1);
  const changed: ChangedFlag[] = [];
  flags.tEnd.forEach((tEnd, i) => {
    const [quality, checks] = [flags.quality[i]!, flags.checks[i]!];
    if (quality !== series.quality[i + shift] || checks !== series.checks[i + shift]) {
      changed.push({ sensorId: series.sensorId, tEnd, quality, checks });
    }
  });
  return changed;
}
