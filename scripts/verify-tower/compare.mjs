import { blockEndOf } from './stamps.mjs';

const LAPSE_RATE_K_PER_KM = 0.001;
const OF_ITS_SIZE = 1e-9;
const STRENGTH_C = 0.001;
const MOST_SHOWN = 10;

const rangeNumber = (range) => range?.exactly ?? range?.atLeast;
const isBlank = (cell) => cell === undefined || cell === '' || /^(nan|null)$/i.test(cell);
const equal = (found, wanted) => found === wanted;
const within = (limit) => (found, wanted) => typeof found === 'number' && Math.abs(found - wanted) <= limit;
/** Absurd values make absurd differences: beyond some size the limit is a share of it. */
const withinOrOfItsSize = (limit) => (found, wanted) =>
  typeof found === 'number' && Math.abs(found - wanted) <= Math.max(limit, OF_ITS_SIZE * Math.abs(wanted));

const lowestInverted = ({ surface }) => ({ present: 1, absent: 0 })[surface];

/** What is compared besides lapse rates: the truth's column, what the service says, and how they must agree. */
const FINDINGS = [
  { column: 'lowest_inverted', found: lowestInverted, agree: equal },
  { column: 'sbi_top_m', found: (profile) => profile.inversion?.topM, agree: within(1e-9) },
  {
    column: 'sbi_strength_K',
    found: (profile) => rangeNumber(profile.inversion?.strengthC),
    agree: withinOrOfItsSize(STRENGTH_C),
  },
  {
    column: 'sbi_cut_by_gap',
    found: (profile) => profile.inversion && Number(profile.inversion.open === 'cut by a missing level'),
    agree: equal,
  },
];

/** The truth's columns of lapse rates between neighbouring levels, and the layer each is about. */
const layersIn = (truth, levels) =>
  levels.slice(1).flatMap((upper, i) => {
    const lower = levels[i];
    const column = Object.keys(truth[0]).find((name) => {
      const [, a, b] = /^gamma_([\d.]+)_([\d.]+)$/.exec(name) ?? [];
      return Number(a) === lower.heightM && Number(b) === upper.heightM;
    });
    if (!column) return [];
    const found = (profile) =>
      profile.layers.find(({ lowerM, upperM }) => lowerM === lower.heightM && upperM === upper.heightM)
        ?.lapseRateKPerKm ?? undefined;
    return [{ column, found, agree: withinOrOfItsSize(LAPSE_RATE_K_PER_KM), isLapseRate: true }];
  });

/** Whether a stamp of the truth can be compared: it stands once in the file and is alone in its block. */
const isAlone = (readings, instant, block) =>
  readings.stamps.get(instant) === 1 && readings.blocks.get(block) === 1;

/** Holds what the service says against the truth, stamp by stamp and value by value. */
export function compare(truth, readings, profiles, options) {
  const compared = [
    ...layersIn(truth, options.levels),
    ...FINDINGS.filter(({ column }) => column in truth[0]),
  ];
  const result = {
    stamps: 0,
    passedOver: 0,
    values: 0,
    agree: 0,
    differ: 0,
    largest: {},
    shown: [],
    columns: {},
  };
  for (const row of truth) {
    const block = row.instant === undefined ? undefined : blockEndOf(row.instant, options);
    if (block === undefined || !isAlone(readings, row.instant, block)) {
      result.passedOver += 1;
      continue;
    }
    const wanted = compared.filter(({ column }) => !isBlank(row[column]));
    if (wanted.length > 0) result.stamps += 1;
    for (const each of wanted) compareValue(each, row, profiles.get(block), result);
  }
  return { ...result, compared: compared.map(({ column }) => column) };
}

function compareValue({ column, found, agree, isLapseRate }, row, profile, result) {
  const wanted = Number(row[column]);
  const said = profile && found(profile);
  result.values += 1;
  result.columns[column] = (result.columns[column] ?? 0) + 1;
  if (typeof said === 'number') {
    const apart = Math.abs(said - wanted);
    const kind = isLapseRate ? 'lapse rate, K/km' : column;
    result.largest[kind] = Math.max(result.largest[kind] ?? 0, apart);
  }
  if (agree(said, wanted)) {
    result.agree += 1;
    return;
  }
  result.differ += 1;
  if (result.shown.length < MOST_SHOWN) {
    result.shown.push({
      stamp: row.stamp,
      column,
      wanted,
      said: profile ? (said ?? 'nothing') : 'no profile',
    });
  }
}
