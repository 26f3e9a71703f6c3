import type { ChangedFindings } from './types';
import { changeSentences } from './words';

const none: ChangedFindings = {
  ...{
    blocksChanged: 0,
    presentToAbsent: 0,
    absentToPresent: 0,
    toNotKnown: 0,
    fromNotKnown: 0,
    toNotSure: 0,
    toSure: 0,
  },
  ...{
    strongestBeforeC: null,
    strongestAfterC: null,
    inversionHoursBefore: 0,
    inversionHoursAfter: 0,
    districts: [],
  },
};

it.each<[string, Partial<ChangedFindings>, string[]]>([
  ['nothing', {}, ['Nothing in the findings is different.']],
  [
    'a weaker night',
    {
      ...{
        blocksChanged: 84,
        presentToAbsent: 3,
        toNotSure: 2,
        strongestBeforeC: 3.98,
        strongestAfterC: 2.79,
      },
      ...{ inversionHoursBefore: 14, inversionHoursAfter: 13.5 },
      districts: [{ districtId: 1, name: 'Mill Flats', truthsChanged: 12 }],
    },
    [
      '84 blocks changed: 3 blocks from inversion to none, 2 blocks from sure to not sure.',
      'In them an inversion for 13 h 30, before 14 h.',
      'Strongest 2.8 °C, before 4.0 °C.',
      'In Mill Flats the rule now says otherwise for 12 blocks.',
    ],
  ],
  [
    'what no rule minds',
    { blocksChanged: 1, districts: [{ districtId: 1, name: 'Mill Flats', truthsChanged: 0 }] },
    [
      '1 block changed; none changed between inversion, none and not known, or in how sure it is.',
      'No rule says otherwise.',
    ],
  ],
])('says %s', (_, changes, sentences) => expect(changeSentences({ ...none, ...changes })).toEqual(sentences));
