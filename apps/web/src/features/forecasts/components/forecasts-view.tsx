import { Box, Stack } from '@chakra-ui/react';
import { Loaded } from '../../../components/states/loaded';
import { Card } from '../../../components/ui/card';
import { Field } from '../../../components/ui/field';
import { PartTitle } from '../../../components/ui/heading';
import { Select } from '../../../components/ui/input';
import type { District } from '../../../lib/api/types';
import { useNow } from '../../../lib/clock';
import { useForecasts, useSkill } from '../api';
import { nightAtHand, today } from '../days';
import { skillInWords } from '../words';
import { ForecastForm } from './forecast-form';
import { ForecastList } from './forecast-list';
import { TableUpload } from './table-upload';

interface ForecastsViewProps {
  districts: District[];
  district: District;
  canWrite: boolean;
  onDistrict: (slug: string) => void;
}

/** A district's forecasts: tonight's to be entered, how such forecasts did, and the days behind. */
export function ForecastsView({ districts, district, canWrite, onDistrict }: ForecastsViewProps) {
  const { id, timeZone: zone } = district;
  const now = useNow();
  const night = nightAtHand(now, zone);
  const forecasts = useForecasts(id, today(now, zone));
  const skill = useSkill(id);
  const onEntered = () => void forecasts.mutate();
  return (
    <Stack gap="4">
      <Box maxW="320px">
        <Field label="District">
          <Select value={district.slug} onChange={({ target }) => onDistrict(target.value)}>
            {districts.map(({ slug, name }) => (
              <option key={slug} value={slug}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      </Box>
      <Loaded from={forecasts} what="the forecasts">
        {(all) => (
          <>
            {canWrite && (
              <Card padded>
                <PartTitle mb="3">The night at hand and the day after</PartTitle>
                <ForecastForm
                  key={`${id} ${night}`}
                  {...{ districtId: id, night, onEntered }}
                  known={(asked) => all.find(({ day }) => day === asked)}
                />
              </Card>
            )}
            <Card padded>
              <PartTitle mb="2">How such forecasts did</PartTitle>
              <Loaded from={skill} what="how forecasts did">
                {(found) => skillInWords(found).map((sentence) => <p key={sentence}>{sentence}</p>)}
              </Loaded>
            </Card>
            <Card padded>
              <PartTitle mb="2">The last 30 days</PartTitle>
              <ForecastList forecasts={all} zone={zone} />
              {all.some(({ outcome }) => outcome) && (
                <Box color="mute" fontSize="sm" mt="2">
                  Behind the arrow: what {all.find(({ outcome }) => outcome)?.outcome?.towerName} measured;
                  the mixing height by the parcel method, from the morning’s profile and the day’s high. In
                  brackets: forecast minus measured.
                </Box>
              )}
            </Card>
          </>
        )}
      </Loaded>
      {canWrite && (
        <Card padded>
          <PartTitle mb="2">Bring a table</PartTitle>
          <TableUpload onEntered={onEntered} />
        </Card>
      )}
    </Stack>
  );
}
