import type { RuleDefinition } from '@lidwatch/rules';
import type { SignedIn } from '../auth/signed-in';
import { makeUser } from './people';
import type { TestApp } from './test-app';
import { RulesService } from '../rules/rules.service';
import { BLOCK_S, inversion, type Valley } from './valley';

const strong = (value: number) =>
  ({ measure: 'inversionStrengthC', op: '>=', value, heldMinutes: 60, toleranceMinutes: 0 }) as const;
const sure = { measure: 'inversionSure', op: '=', value: true } as const;
const weak = { measure: 'strengthWithinTowerC', op: '<', value: 1, heldMinutes: 60 } as const;
const gone = { all: [weak, { measure: 'inversionStrengthC', op: '<', value: 1, heldMinutes: 60 }] } as const;

/** A rule with both kinds: an advisory from 2 °C, a burn ban from 5 °C, each held an hour and sure. */
export const eveningRule: RuleDefinition = {
  advisory: {
    begin: { all: [strong(2), sure] },
    end: gone,
    longestValidityHours: 24,
    earliestReproposalMinutes: 120,
  },
  burnBan: { begin: { all: [strong(5), sure] }, end: gone, longestValidityHours: 24 },
};

/** Puts a rule in force in a district, as a new analyst. */
export async function putRuleInForce(
  test: TestApp,
  districtId: number,
  body: RuleDefinition = eveningRule,
): Promise<number> {
  const by: SignedIn = { ...(await makeUser(test, 'analyst')), role: 'analyst', districtIds: [] };
  const rules = test.app.get(RulesService, { strict: false });
  const { id } = await rules.draft(districtId, { body: { ...body }, note: '' }, by);
  await rules.putInForce(id, by);
  return id;
}

/** Lets blocks go by, the clock moving with them: a strength of the inversion in °C each, null for a silent tower. */
export async function goBy(
  test: TestApp,
  valley: Valley,
  strengths: readonly (number | null)[],
): Promise<void> {
  for (const strength of strengths) {
    const tEnd = (Math.floor(test.clock.now() / BLOCK_S) + 1) * BLOCK_S;
    test.clock.set(tEnd);
    // A silent tower still gives its top level, so that the block exists and says that nothing is known.
    await valley.give(0, tEnd, strength === null ? [null, null, null, -5] : inversion(strength, tEnd));
    await valley.settle();
  }
}
