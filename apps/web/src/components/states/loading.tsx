import { Box, Skeleton, Stack } from '@chakra-ui/react';

/** A place held while something loads: as many bars as there will be rows, so that nothing jumps when it comes. */
export function Loading({
  label,
  rows = 3,
  rowHeight = '16',
}: {
  label: string;
  rows?: number;
  rowHeight?: string;
}) {
  return (
    <Box role="status" aria-live="polite">
      <Box srOnly>Loading {label}…</Box>
      <Stack gap="2" aria-hidden="true">
        {Array.from({ length: rows }, (_, row) => (
          <Skeleton key={row} height={rowHeight} bg="line" borderRadius="l3" />
        ))}
      </Stack>
    </Box>
  );
}
