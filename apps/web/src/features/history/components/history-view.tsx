import { Box, Stack } from '@chakra-ui/react';
import { isNightly } from '../../../components/charts/nightly';
import { StrengthHistory } from '../../../components/charts/strength-history';
import { isInSteps } from '../../../components/charts/strength-series';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import type { District, DistrictHistory } from '../../../lib/api/types';
import { useDistrictHistory } from '../../../lib/api/use-district-history';
import { useNow } from '../../../lib/clock';
import { dateAndTime, duration } from '../../../lib/format/time';
import { spanEnds } from '../spans';
import { useHistoryChoice } from '../use-history-choice';
import { CurrentProfile } from './current-profile';
import { SpanBar } from './span-bar';

/** The dashboard of one district: strength over a chosen span, and the profile now. */
export function HistoryView({ districts }: { districts: District[] }) {
  const choice = useHistoryChoice();
  const chosen = districts.find(({ slug }) => slug === choice.slug) ?? districts[0];
  if (!chosen)
    return <Empty title="No district yet">An administrator adds districts and their towers first.</Empty>;
  return <DistrictHistoryView key={chosen.id} districts={districts} chosen={chosen} choice={choice} />;
}

interface DistrictHistoryViewProps {
  districts: District[];
  chosen: District;
  choice: ReturnType<typeof useHistoryChoice>;
}

function DistrictHistoryView({ districts, chosen, choice }: DistrictHistoryViewProps) {
  const ends = spanEnds(choice, useNow(), chosen.timeZone);
  const incomplete = choice.name === 'dates' && !ends;
  const history = useDistrictHistory(ends ? chosen.id : undefined, ends ?? { from: '', to: '' }, {
    live: true,
  });
  return (
    <Stack gap="4">
      <SpanBar
        districts={districts}
        chosen={chosen}
        {...choice}
        error={
          incomplete && choice.from && choice.to ? 'The first day must not be after the last.' : undefined
        }
        onChange={choice.change}
      />
      <Card padded minW="0">
        <PartTitle mb="2">
          Strength of the surface inversion, {chosen.name}{' '}
          {ends && (
            <Muted small fontWeight="400">
              {dateAndTime(ends.from, chosen.timeZone)} to {dateAndTime(ends.to, chosen.timeZone)}
            </Muted>
          )}
        </PartTitle>
        {incomplete ? (
          <Empty title="Choose the first and the last day" />
        ) : (
          <Loaded
            from={history}
            what="the history"
            loading={<Loading label="the history" rows={1} rowHeight="380px" />}
          >
            {(data) => (
              <>
                <StrengthHistory history={data} name={chosen.name} height={340} />
                <Box color="mute" fontSize="sm">
                  {isNightly(data)
                    ? 'One bar each night, noon to noon: its strongest within the tower'
                    : pointsInWords(data)}
                  ; framed: not known; dashed: the rule’s limits.
                </Box>
              </>
            )}
          </Loaded>
        )}
      </Card>
      <CurrentProfile district={chosen} />
    </Stack>
  );
}

/** What one point of the line stands for. */
const pointsInWords = (history: DistrictHistory): string =>
  isInSteps(history)
    ? `Each point the strongest of ${duration(history.stepMinutes)}, within the tower`
    : `One point each ${history.stepMinutes} min, within the tower`;
