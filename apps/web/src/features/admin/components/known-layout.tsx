import { Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Button } from '../../../components/ui/button';
import { Muted } from '../../../components/ui/heading';
import { useLastUpload } from '../api';
import type { Source } from '../types';

interface KnownLayoutProps {
  towerId: number;
  onTake: (layout: Source['mapping']) => void;
}

/** Offers the layout by which the tower's last uploaded file was read, where there is one: it has been looked at. */
export function KnownLayout({ towerId, onTake }: KnownLayoutProps) {
  const last = useLastUpload(towerId);
  const [taken, setTaken] = useState(false);
  if (!last?.mapping) return null;
  const { mapping } = last;
  const take = () => {
    onTake(mapping);
    setTaken(true);
  };
  return (
    <Stack direction="row" align="center" gap="3" wrap="wrap">
      <Button size="sm" onClick={take}>
        Take the layout of {last.name}
      </Button>
      <Muted small role="status">
        {taken ? 'Taken. Look it over, then go on.' : 'The last file that was uploaded for this tower.'}
      </Muted>
    </Stack>
  );
}
