import { Box, chakra, Flex } from '@chakra-ui/react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { useAct } from '../../../lib/use-act';
import { putInForce } from '../api';
import type { Rule } from '../types';

const Lines = chakra('pre', {
  base: { fontFamily: 'body', whiteSpace: 'pre-wrap', margin: 0, tabSize: 2, lineHeight: '1.5' },
});
const KIND = { advisory: 'Advisory', burnBan: 'Burn ban' } as const;

interface RuleVersionProps {
  rule: Rule;
  mayChange: boolean;
  onChanged: () => void;
}

/** One version of a rule in plain words; a draft can be put in force, which ends the version before it. */
export function RuleVersion({ rule, mayChange, onChanged }: RuleVersionProps) {
  const { run, busy, problem } = useAct(async (id: number) => {
    await putInForce(id);
    onChanged();
  });
  return (
    <Card padded>
      <Flex justify="space-between" gap="3" wrap="wrap" mb="3">
        <PartTitle>
          Version {rule.version}, {rule.state}
        </PartTitle>
        {mayChange && rule.state === 'draft' && (
          <Button kind="go" busy={busy} onClick={() => void run(rule.id)}>
            Put version {rule.version} in force
          </Button>
        )}
      </Flex>
      {rule.note && (
        <Box color="mute" mb="3">
          {rule.note}
        </Box>
      )}
      <Refusal problem={problem} />
      {rule.state !== 'past' &&
        rule.inWords.map(({ kind, begin, end }) => (
          <Box key={kind} mb="3">
            <strong>{KIND[kind]} begins</strong>
            <Lines>{begin.join('\n')}</Lines>
            <strong>{KIND[kind]} ends</strong>
            <Lines>{end.join('\n')}</Lines>
          </Box>
        ))}
    </Card>
  );
}
