import type { Kind, Role } from '../../lib/api/types';

/** Somebody who signs in, as the administrator sees them. */
export interface User {
  id: number;
  email: string;
  name: string;
  role: Role;
  state: 'invited' | 'active' | 'retired';
  districtIds: number[];
}

/** What a sensor measures. */
export const QUANTITIES = [
  'air temperature',
  'relative humidity',
  'dew point',
  'wet bulb',
  'wind speed',
  'wind direction',
  'station pressure',
  'pm2.5',
] as const;

export interface Sensor {
  id: number;
  name: string;
  quantity: (typeof QUANTITIES)[number];
  unit: string;
  heightM: number;
  sigma: number;
  offset: number;
  gain: number;
  retired: boolean;
}

export interface Tower {
  id: number;
  slug: string;
  name: string;
  elevationM: number;
  latitude: number;
  longitude: number;
  intervalMinutes: number;
  blockMinutes: number;
  staleLimitMinutes: number | null;
  clock: string;
  stamp: 'instant' | 'start' | 'middle' | 'end';
  screening: 'full' | 'report-only';
  inversionForm: 'plain' | 'sensor-aware';
  retired: boolean;
  sensors: Sensor[];
  version: number;
}

export interface Source {
  id: number;
  kind: 'folder' | 'push';
  path: string | null;
  mapping: Record<string, unknown>;
  intervalSeconds: number;
  lastAt: string | null;
  lastResult: string | null;
  failures: number;
}

export interface IngestKey {
  id: number;
  name: string;
  createdAt: string;
  lastUsedAt: string | null;
  revokedAt: string | null;
}

export interface District {
  id: number;
  slug: string;
  name: string;
  timeZone: string;
  latitude: number;
  longitude: number;
  elevationM: number | null;
  population: number | null;
  areaText: string;
  ordinanceRef: string;
  contactPhone: string;
  combine: 'first-fresh' | 'any' | 'all' | 'median';
  towers: { towerId: number; mayBegin: boolean; mayEnd: boolean }[];
  floorTowerId: number | null;
  benchTowerId: number | null;
  pm25TowerId: number | null;
  version: number;
}

/** A version of a district's rule, as data and in plain lines. */
export interface Rule {
  id: number;
  version: number;
  state: 'draft' | 'in force' | 'past';
  note: string;
  body: Record<string, unknown>;
  inWords: { kind: Kind; begin: string[]; end: string[] }[];
  createdAt: string;
  fromAt?: string;
  toAt?: string;
}

/** Something a rule may ask about. */
export interface Measure {
  name: string;
  unit: string;
  label: { en: string };
  docs: string;
  ops: string[];
}

/** The office that signs the notices. */
export interface Office {
  name: string;
  phone: string;
}
