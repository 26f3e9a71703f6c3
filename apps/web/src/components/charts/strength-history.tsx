import { Box, Flex } from '@chakra-ui/react';
import { useState } from 'react';
import { Button } from '../ui/button';
import type { DistrictHistory } from '../../lib/api/types';
import { downloadText } from '../../lib/download';
import { StrengthChart } from './strength-chart';
import { strengthCsv } from './strength-csv';
import { StrengthTable } from './strength-table';
import { strengthWords } from './strength-words';

interface StrengthHistoryProps {
  history: DistrictHistory;
  /** The district's name. */
  name: string;
  height?: number;
}

/** The history of strength as chart, in words, as a table and as a file. */
export function StrengthHistory({ history, name, height = 260 }: StrengthHistoryProps) {
  const [asTable, setAsTable] = useState(false);
  const words = strengthWords(history, name, Date.now());
  const save = () =>
    downloadText(`strength-${name.toLowerCase().replace(/\W+/g, '-')}.csv`, strengthCsv(history));
  return (
    <Box>
      {asTable ? (
        <StrengthTable history={history} name={name} />
      ) : (
        <StrengthChart
          history={history}
          label={`Strength of the surface inversion in ${name}. ${words}`}
          height={height}
        />
      )}
      <Flex gap="3" mt="2" align="center" wrap="wrap">
        <Box color="mute" fontSize="sm" flex="1" minW="240px">
          {words}
        </Box>
        <Flex gap="1" data-screen-only>
          <Button kind="quiet" size="sm" aria-pressed={asTable} onClick={() => setAsTable(!asTable)}>
            {asTable ? 'Chart' : 'Table'}
          </Button>
          <Button kind="quiet" size="sm" onClick={save}>
            CSV
          </Button>
        </Flex>
      </Flex>
    </Box>
  );
}
