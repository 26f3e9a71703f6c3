import { Grid } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** Entries side by side where there is room, one under the other on a phone. */
export function EntryGrid({ children }: { children: ReactNode }) {
  return (
    <Grid templateColumns="repeat(auto-fill, minmax(min(100%, 200px), 1fr))" gap="4" alignItems="start">
      {children}
    </Grid>
  );
}
