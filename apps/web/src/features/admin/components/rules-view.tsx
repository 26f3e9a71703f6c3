import { Box, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { Field } from '../../../components/ui/field';
import { PartTitle } from '../../../components/ui/heading';
import { Select } from '../../../components/ui/input';
import { useRules } from '../api';
import type { District } from '../types';
import { RuleDraftForm } from './rule-draft-form';
import { RuleVersion } from './rule-version';

interface RulesViewProps {
  districts: readonly District[];
  /** Analysts draft rules and put them in force; others read. */
  mayDraft: boolean;
}

/** One district's rules: each version in plain words, and a form for a new draft. */
export function RulesView({ districts, mayDraft }: RulesViewProps) {
  const [districtId, setDistrictId] = useState(districts[0]?.id);
  const rules = useRules(districtId);
  if (districts.length === 0)
    return <Empty title="No district yet">An administrator adds the first one.</Empty>;
  const inForce = rules.data?.find(({ state }) => state === 'in force');
  return (
    <Stack gap="5">
      <Box maxW="20rem">
        <Field label="District">
          <Select value={districtId} onChange={({ target }) => setDistrictId(Number(target.value))}>
            {districts.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Loaded from={rules} what="the rules">
        {(all) =>
          all.length === 0 ? (
            <Empty title="No rule yet">Without a rule in force nothing is proposed for this district.</Empty>
          ) : (
            <Stack gap="4">
              {all.map((rule) => (
                <RuleVersion
                  key={rule.id}
                  rule={rule}
                  mayChange={mayDraft}
                  onChanged={() => void rules.mutate()}
                />
              ))}
            </Stack>
          )
        }
      </Loaded>
      {mayDraft && districtId !== undefined && (
        <Card padded>
          <PartTitle mb="3">Draft a version</PartTitle>
          <RuleDraftForm
            key={`${districtId} ${inForce?.id}`}
            districtId={districtId}
            from={inForce?.body}
            onDrafted={() => void rules.mutate()}
          />
        </Card>
      )}
    </Stack>
  );
}
