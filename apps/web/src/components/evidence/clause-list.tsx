import { Box, chakra } from '@chakra-ui/react';
import {
  describeClause,
  describeGroup,
  isMeasureName,
  type EvaluatedClause as RuleClause,
} from '@lidwatch/rules';
import type { EvaluatedClause, EvaluatedNode } from '../../lib/api/types';
import { duration } from '../../lib/format/time';
import { measuredText } from './measured';
import { TruthMark } from './truth-mark';

/** Truth, words, what was measured: in one line where there is room, the words below on a phone. */
const Row = chakra('div', {
  base: {
    display: 'grid',
    gridTemplateAreas: { base: '"truth found" "words words"', md: '"truth words found"' },
    gridTemplateColumns: { base: 'auto 1fr', md: '104px 1fr auto' },
    columnGap: '3',
    py: '2',
    borderTopWidth: '1px',
    borderColor: 'line',
    alignItems: 'baseline',
  },
});

/** The rule's own clauses as they were found: met, not met or not known, the limit, what was measured, held for. */
export function ClauseList({ tree }: { tree: EvaluatedNode }) {
  if (tree.kind === 'all' && !tree.held) return <Parts parts={tree.parts} />;
  return <Node node={tree} />;
}

function Parts({ parts }: { parts: EvaluatedNode[] }) {
  return (
    <Box as="ul" listStyleType="none" m="0" p="0">
      {parts.map((part, index) => (
        <li key={index}>
          <Node node={part} />
        </li>
      ))}
    </Box>
  );
}

function Node({ node }: { node: EvaluatedNode }) {
  if (node.kind === 'clause') return <Clause clause={node} />;
  const held = node.held ? { heldMinutes: node.held.neededMinutes } : {};
  return (
    <>
      <Row>
        <Box gridArea="truth">
          <TruthMark truth={node.truth} />
        </Box>
        <Box gridArea="words">{describeGroup(node.kind, held, 'en')}</Box>
        <Box gridArea="found">
          <HeldFor node={node} />
        </Box>
      </Row>
      <Box ms="1.5" ps="4" borderInlineStartWidth="2px" borderColor="line">
        <Parts parts={node.parts} />
      </Box>
    </>
  );
}

function Clause({ clause }: { clause: EvaluatedClause }) {
  const { notKnown } = clause.measured;
  return (
    <Row>
      <Box gridArea="truth">
        <TruthMark truth={clause.truth} />
      </Box>
      <Box gridArea="words" minW="0">
        {clauseWords(clause)}
        {notKnown && (
          <Box color="mute" fontSize="sm">
            {notKnown}
          </Box>
        )}
      </Box>
      <Box gridArea="found" textAlign="end" fontWeight="600">
        {measuredText(clause.measure, clause.measured)}
        <HeldFor node={clause} />
      </Box>
    </Row>
  );
}

/** For how long it has held, and how much of the time asked for is not known. */
function HeldFor({ node: { held } }: { node: EvaluatedNode }) {
  if (!held) return null;
  return (
    <Box color="mute" fontSize="sm" fontWeight="400" textAlign="end">
      held {held.unbrokenOrMore && 'at least '}
      {duration(held.unbrokenMinutes ?? held.trueMinutes)}
      {held.notKnownMinutes > 0 && `, ${duration(held.notKnownMinutes)} not known`}
    </Box>
  );
}

function clauseWords({ measure, op, value, held }: EvaluatedClause): string {
  if (!isMeasureName(measure)) return `${measure} ${op} ${String(value)}`;
  const asked = held ? { heldMinutes: held.neededMinutes } : {};
  return describeClause({ measure, op: op as RuleClause['op'], value, ...asked }, 'en');
}
