import { Box, chakra, Stack } from '@chakra-ui/react';
import { curlExample, curlFileExample } from './curl-example';

const Command = chakra('pre', {
  base: { fontSize: 'sm', whiteSpace: 'pre-wrap', overflowWrap: 'anywhere', m: '0', p: '2', bg: 'card' },
});

interface PushExamplesProps {
  /** The key, or what stands for it once it is not shown any more. */
  apiKey: string;
  sensor: string | undefined;
}

/** How a site pushes: to try the key, to send a file, and what is answered. */
export function PushExamples({ apiKey, sensor }: PushExamplesProps) {
  const { origin } = window.location;
  return (
    <Stack gap="2">
      <Box>To try it. Its value is null, no reading: nothing is written, and every fault is told.</Box>
      <Command>{curlExample(origin, apiKey, sensor)}</Command>
      <Box>To send a whole file, packed:</Box>
      <Command>{curlFileExample(origin, apiKey)}</Command>
      <Box>
        The answer counts what was new, repeated, corrected and refused, and names each refused row with the
        cure. Sending the same again changes nothing. A request holds 10 MB at most, unpacked, and a key sends
        120 requests a minute; an answer 429 says in Retry-After how many seconds to wait.
      </Box>
    </Stack>
  );
}
