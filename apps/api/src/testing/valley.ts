import { DirtyStages } from '../database/dirty';
import { ReadingsService } from '../readings/readings.service';
import { makeDistrict, makeTower } from './places';
import type { TestApp } from './test-app';

/** Length of the blocks of the towers `makeValley` makes, s. */
export const BLOCK_S = 600;

/** A district with towers whose readings tests write: each gives one reading a block at 2, 10, 30 and 60 m. */
export interface Valley {
  readonly districtId: number;
  readonly towerIds: readonly number[];
  /** Takes in one block of a tower: temperatures in °C from the lowest level up, null for a silent sensor. */
  give(tower: number, tEnd: number, temperaturesC: readonly (number | null)[]): Promise<void>;
  /** Works out everything up to the clock. */
  settle(): Promise<void>;
}

/**
 * Temperatures of an inversion of some strength at 2, 10, 30 and 60 m, °C. From 2 °C it reaches the top of the tower;
 * a weaker one ends at 30 m, so that its strength is a number. The whole cools with time, as a sensor that stood still
 * would not be believed.
 */
export function inversion(strengthC: number, tEnd: number): number[] {
  const groundC = -8 - 0.05 * ((tEnd / BLOCK_S) % 97);
  const shares = strengthC >= 2 ? [0, 0.4, 0.75, 1] : [0, 0.6, 1, 0.4];
  return shares.map((share) => groundC + share * strengthC);
}

/** Makes a district with as many towers as asked, in this order, with what is given for each link. */
export async function makeValley(
  test: TestApp,
  links: readonly { mayBegin?: number; mayEnd?: number; elevationM?: number }[] = [{}],
  district: Record<string, unknown> = {},
): Promise<Valley> {
  const towers: { towerId: number; sensorIds: number[] }[] = [];
  for (const { elevationM = 1150 } of links) {
    towers.push(await makeTower(test, { elevation_m: elevationM, interval_s: BLOCK_S, block_s: BLOCK_S }));
  }
  const districtId = await makeDistrict(test, { name: 'Mill Flats', ...district });
  for (const [position, { mayBegin = 1, mayEnd = 1 }] of links.entries()) {
    await test.sql.run(
      'INSERT INTO district_tower (district_id, tower_id, position, may_begin, may_end) VALUES ($1, $2, $3, $4, $5)',
      [districtId, towers[position]!.towerId, position, mayBegin, mayEnd],
    );
  }
  const readings = test.app.get(ReadingsService, { strict: false });
  const stages = test.app.get(DirtyStages, { strict: false });
  return {
    districtId,
    towerIds: towers.map(({ towerId }) => towerId),
    give: async (tower, tEnd, temperaturesC) => {
      const { towerId, sensorIds } = towers[tower]!;
      const rows = temperaturesC.flatMap((value, i) =>
        value === null ? [] : [{ sensorId: sensorIds[i]!, tEnd, value, rowNo: i }],
      );
      await readings.ingest(towerId, rows, { origin: 'push', name: 'test' });
    },
    settle: () => stages.drainAll(),
  };
}
