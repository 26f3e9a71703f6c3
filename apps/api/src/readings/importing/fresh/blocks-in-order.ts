import { blockFacts } from '../../../profiles/block-facts';
import { findingsOf } from '../../../profiles/findings';
import { hourMean, pm25SensorOf } from '../../../profiles/hour-mean';
import { profileRow } from '../../../profiles/profile-row';
import { blockMean, type BlockMean } from '../../../screening/block-means';
import { meanRow } from '../../../screening/mean-row';
import { firstAfter, type Flags, type Series, type Stretch } from '../../../screening/series';
import { blockEndOf, type TowerLayout } from '../../../towers/tower-layout';
import type { Fresh } from './fresh';

const HOUR_S = 3600;

/** Means and profiles of a tower's blocks, worked out once each in order of time. */
export class BlocksInOrder {
  private readonly pm25SensorId: number | undefined;
  /** PM2.5 means of the last hour. */
  private pm25: { readonly tEnd: number; readonly mean: number }[] = [];

  constructor(private readonly tower: TowerLayout) {
    this.pm25SensorId = pm25SensorOf(tower)?.id;
  }

  /** Those of the blocks that end in the stretch and hold a reading; later stretches follow on this one. */
  between(
    series: readonly Series[],
    flags: readonly Flags[],
    stretch: Stretch,
  ): Pick<Fresh, 'means' | 'profiles' | 'profileEnds' | 'failedEnds'> {
    const means: string[] = [];
    const profiles: string[] = [];
    const [profileEnds, failedEnds]: [number[], number[]] = [[], []];
    for (const tEnd of endsIn(series, this.tower.blockS, stretch)) {
      const own = this.tower.sensors.flatMap(
        (sensor, i) => blockMean(this.tower, sensor, series[i]!, flags[i]!, tEnd) ?? [],
      );
      for (const mean of own) means.push(meanRow(mean));
      const profile = this.profileOf(tEnd, own);
      if (profile === undefined) failedEnds.push(tEnd);
      else {
        profiles.push(profile);
        profileEnds.push(tEnd);
      }
    }
    return { means: `[${means.join()}]`, profiles: `[${profiles.join()}]`, profileEnds, failedEnds };
  }

  /** A block's profile as a JSON row; undefined where it could not be worked out. */
  private profileOf(tEnd: number, means: readonly BlockMean[]): string | undefined {
    const pm25Hour = this.pm25HourOf(tEnd, means);
    try {
      const facts = blockFacts(this.tower, tEnd, means, pm25Hour);
      return facts && JSON.stringify(profileRow(facts, findingsOf(facts, this.tower)));
    } catch (error) {
      // The block keeps its mark: the stage that works it out again says what is wrong with it.
      if (error instanceof Error) return undefined;
      throw error;
    }
  }

  private pm25HourOf(tEnd: number, means: readonly BlockMean[]): number | undefined {
    if (this.pm25SensorId === undefined) return undefined;
    const mean = means.find(({ sensorId }) => sensorId === this.pm25SensorId)?.mean;
    if (typeof mean === 'number') this.pm25.push({ tEnd, mean });
    this.pm25 = this.pm25.filter((each) => each.tEnd > tEnd - HOUR_S);
    return hourMean(
      this.pm25.map((each) => each.mean),
      this.tower.blockS,
    );
  }
}

/** Ends of the blocks in a stretch that hold a reading, ascending. */
function endsIn(series: readonly Series[], blockS: number, { t0, t1 }: Stretch): number[] {
  const ends = new Set<number>();
  for (const { tEnd } of series) {
    let last = -Infinity;
    for (let i = firstAfter(tEnd, t0); i < tEnd.length && tEnd[i]! <= t1; i += 1) {
      if (tEnd[i]! <= last) continue;
      last = blockEndOf(tEnd[i]!, blockS);
      ends.add(last);
    }
  }
  return [...ends].sort((a, b) => a - b);
}
