import { Box, Flex, Grid, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { ClauseList } from '../../../components/evidence/clause-list';
import { NoticeTexts } from '../../../components/notice-text/notice-texts';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { PartTitle } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import type { Me, NoticeDetail } from '../../../lib/api/types';
import { underWayWords } from '../delivery-words';
import { isInForce } from '../notice-state';
import { DeliveryPart } from './delivery-part';
import { EndDialog } from './end-dialog';
import { NoticeEvents } from './notice-events';
import { NoticeFacts } from './notice-facts';

interface NoticeViewProps {
  notice: NoticeDetail;
  me: Me;
  zone: string;
  onAnswer: () => void;
}

/** A notice in full: facts, texts as sent, evidence, what happened to it, and where each message is. Prints well. */
export function NoticeView({ notice, me, zone, onAnswer }: NoticeViewProps) {
  const [ending, setEnding] = useState(false);
  const { state: arrived } = useLocation() as { state: { justDone?: 'begin' | 'end' } | null };
  const mayEnd =
    isInForce(notice) && me.role === 'officer' && me.districts.some(({ id }) => id === notice.districtId);
  return (
    <Stack gap="4">
      {arrived?.justDone && (
        <Message tone="done" title={arrived.justDone === 'begin' ? 'It is issued.' : 'It is ended.'}>
          {underWayWords(notice.delivery)}
        </Message>
      )}
      <Flex gap="2" data-screen-only>
        {mayEnd && <Button onClick={() => setEnding(true)}>End…</Button>}
        <Button onClick={() => window.print()}>Print</Button>
      </Flex>
      <Grid
        gap="4"
        alignItems="start"
        templateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) minmax(0, 1fr)' }}
      >
        <Stack gap="4" minW="0">
          <Card padded>
            <NoticeFacts notice={notice} zone={zone} />
          </Card>
          <Card padded>
            <PartTitle mb="2">What happened</PartTitle>
            <NoticeEvents events={notice.events} zone={zone} />
          </Card>
          {notice.evidence && (
            <Card padded>
              <PartTitle mb="2">Evidence: the rule’s own clauses</PartTitle>
              <ClauseList tree={notice.evidence.tree} />
              <Box color="mute" fontSize="sm" mt="2" overflowWrap="anywhere">
                SHA-256 {notice.evidence.sha256}
              </Box>
            </Card>
          )}
        </Stack>
        <Stack gap="4" minW="0">
          <Card padded>
            <PartTitle mb="2">Texts as sent</PartTitle>
            <NoticeTexts texts={notice.texts} />
          </Card>
          <DeliveryPart notice={notice} zone={zone} />
        </Stack>
      </Grid>
      {ending && <EndDialog open notice={notice} onClose={() => setEnding(false)} onAnswer={onAnswer} />}
    </Stack>
  );
}
