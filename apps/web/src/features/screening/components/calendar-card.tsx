import { Flex, Stack } from '@chakra-ui/react';
import { Empty } from '../../../components/states/empty';
import { Loaded } from '../../../components/states/loaded';
import { Loading } from '../../../components/states/loading';
import { Button } from '../../../components/ui/button';
import { Card } from '../../../components/ui/card';
import { Muted, PartTitle } from '../../../components/ui/heading';
import { useCalendar } from '../api';
import { CALENDAR_DAYS, calendarDays, dayAfter } from '../days';
import { calendarSentence } from '../day-words';
import type { ReadingsChoice } from '../use-readings-choice';
import { CalendarGrid } from './calendar-grid';
import { DayTable } from './day-table';

interface CalendarCardProps {
  towerId: number;
  choice: ReadingsChoice;
}

/** How complete the readings of each day are: five weeks as a calendar, the chosen day in numbers. */
export function CalendarCard({ towerId, choice: { day, days, today, change } }: CalendarCardProps) {
  const weeks = calendarDays(day, today);
  const calendar = useCalendar(towerId, weeks);
  const chosen = Array.from({ length: days }, (_, i) => dayAfter(day, -i));
  const later = dayAfter(day, CALENDAR_DAYS);
  return (
    <Card padded minW="0">
      <Flex justify="space-between" gap="3" wrap="wrap" mb="2">
        <PartTitle>Completeness</PartTitle>
        <Flex gap="1.5" data-screen-only>
          <Button size="sm" onClick={() => change({ day: dayAfter(day, -CALENDAR_DAYS) })}>
            Earlier weeks
          </Button>
          <Button
            size="sm"
            disabled={weeks.to >= today}
            onClick={() => change({ day: later > today ? today : later })}
          >
            Later weeks
          </Button>
        </Flex>
      </Flex>
      <Loaded
        from={calendar}
        what="the calendar"
        loading={<Loading label="the calendar" rows={1} rowHeight="260px" />}
      >
        {(data) =>
          data.sensors.length === 0 ? (
            <Empty title="This tower has no sensor yet">Add its sensors under administration first.</Empty>
          ) : (
            <Stack gap="4">
              <CalendarGrid
                calendar={data}
                chosen={chosen}
                onDay={(chosenDay) => change({ day: chosenDay })}
              />
              <Muted small>
                {calendarSentence(data.days)} As high as the share that can be used; dashed: nothing came;
                triangle: a tenth or more suspect; cross: some failed. Days are those of {data.timeZone}.
              </Muted>
              {data.days
                .filter((each) => each.day === day)
                .map((each) => (
                  <DayTable key={each.day} day={each} sensors={data.sensors} zone={data.timeZone} />
                ))}
            </Stack>
          )
        }
      </Loaded>
    </Card>
  );
}
