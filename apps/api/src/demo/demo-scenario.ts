import { readFileSync } from 'node:fs';
import path from 'node:path';
import type { Role } from '@lidwatch/contracts';
import type { DistrictInput } from '../districts/dto/district-input.dto';
import type { SensorInput } from '../towers/dto/sensor-input.dto';
import type { TowerInput } from '../towers/dto/tower-input.dto';

const FOLDER = path.resolve(__dirname, '../../../../fixtures/demo');
const read = <T>(name: string): T => JSON.parse(readFileSync(path.join(FOLDER, `${name}.json`), 'utf8')) as T;

/** Somebody of the demo's office; an officer with the districts' names. */
export interface DemoPerson {
  readonly key: 'administrator' | 'analyst' | 'deputy' | 'floorOfficer' | 'benchOfficer';
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly districts?: readonly string[];
}

/** A district whose towers are named by slug. */
export type DemoDistrict = Omit<DistrictInput, 'towers' | 'floorTowerId' | 'benchTowerId' | 'pm25TowerId'> & {
  readonly slug: string;
  readonly towers: readonly { readonly slug: string; readonly mayBegin: boolean; readonly mayEnd: boolean }[];
  readonly floorTower: string;
  readonly benchTower: string;
  readonly pm25Tower: string | null;
};

/** A tower with its sensors. */
export type DemoTower = TowerInput & { readonly slug: string; readonly sensors: readonly SensorInput[] };

/** How the residents' list is made up. */
export interface DemoList {
  readonly people: number;
  readonly duringHistory: number;
  readonly origin: string;
  readonly shares: Readonly<
    Record<
      'textOnly' | 'mailOnly' | 'both' | 'spanish' | 'alsoSecondDistrict' | 'burnBanOnly' | 'bouncingMail',
      number
    >
  >;
  readonly districtShares: Readonly<Record<string, number>>;
  readonly mailDomains: readonly string[];
  readonly areaCodes: readonly string[];
  readonly firstNames: readonly string[];
  readonly lastNames: readonly string[];
}

/** What the staff write when they decide. */
export type DemoWords = Readonly<
  Record<'confirmBegin' | 'confirmEnd' | 'declineBegin' | 'returnBegin' | 'holdOpen', readonly string[]>
>;

/** Everything that `fixtures/demo` tells, except the weather, which the loggers know. */
export interface DemoScenario {
  readonly password: string;
  readonly staff: readonly DemoPerson[];
  readonly office: { readonly name: string; readonly phone: string };
  readonly districts: readonly DemoDistrict[];
  readonly towers: readonly DemoTower[];
  readonly ruleNote: string;
  readonly rules: Readonly<Record<string, Record<string, unknown>>>;
  readonly list: DemoList;
  readonly words: DemoWords;
}

/** Reads the demo's scenario. */
export function demoScenario(): DemoScenario {
  const { note, rules } = read<{ note: string; rules: DemoScenario['rules'] }>('rules');
  return {
    ...read<Pick<DemoScenario, 'password' | 'staff'>>('staff'),
    ...read<Pick<DemoScenario, 'office' | 'districts'>>('districts'),
    ...read<Pick<DemoScenario, 'towers'>>('towers'),
    list: read('subscribers'),
    words: read('words'),
    ruleNote: note,
    rules,
  };
}
