import { Box, Stack } from '@chakra-ui/react';
import { useState } from 'react';
import { Refusal } from '../../../components/states/refusal';
import { Button } from '../../../components/ui/button';
import { Muted, SmallTitle } from '../../../components/ui/heading';
import { Message } from '../../../components/ui/message';
import { useNow } from '../../../lib/clock';
import { useAct } from '../../../lib/use-act';
import { collectSource } from '../api';
import type { Source } from '../types';
import { intervalWords } from './interval-choices';
import { RetireSourceDialog } from './retire-source-dialog';
import { SourceForm } from './source-form';
import { placeOf, sourceState } from './source-state';

interface SourceRowProps {
  source: Source;
  zone: string;
  /** Whether this person may change sources over HTTP. */
  mayUseHttp: boolean;
  onChanged: () => void;
}

const KIND_WORDS: Record<Source['kind'], string> = { folder: 'Folder', http: 'HTTP', push: 'Push' };
const AUTH_WORDS: Record<Source['auth'], string> = {
  none: '',
  basic: 'with name and password',
  bearer: 'with a token',
};

function settingsOf({ kind, intervalSeconds, auth, mapping }: Source): string {
  const often = kind === 'push' ? '' : `every ${intervalWords(intervalSeconds)}`;
  return [KIND_WORDS[kind], often, AUTH_WORDS[auth], `${mapping.format ?? 'wide'} table`]
    .filter(Boolean)
    .join(' · ');
}

/** One source: how it stands, and what can be done with it. */
export function SourceRow({ source, zone, mayUseHttp, onChanged }: SourceRowProps) {
  const [doing, setDoing] = useState<'change' | 'retire'>();
  const { tone, title, text } = sourceState(source, zone, useNow());
  const collect = useAct(async (id: number) => {
    await collectSource(id);
    onChanged();
  });
  const stop = () => setDoing(undefined);
  const done = () => {
    onChanged();
    stop();
  };
  const place = placeOf(source);
  const mayChange = mayUseHttp || source.kind !== 'http';
  return (
    <Stack as="li" gap="2" py="3" borderTopWidth="1px" borderColor="line">
      <Box>
        <SmallTitle overflowWrap="anywhere">{place}</SmallTitle>
        <Muted small>{settingsOf(source)}</Muted>
      </Box>
      {tone === 'failing' ? (
        <Message tone="warn" title={title}>
          {text}
        </Message>
      ) : (
        <Box>{text}</Box>
      )}
      <Refusal problem={collect.problem} />
      {doing === 'change' ? (
        <SourceForm
          towerId={source.towerId}
          source={source}
          mayUseHttp={mayUseHttp}
          onDone={done}
          onCancel={stop}
        />
      ) : (
        <Stack direction="row" gap="2" wrap="wrap">
          {source.kind !== 'push' && (
            <Button
              size="sm"
              busy={collect.busy || source.collecting}
              onClick={() => void collect.run(source.id)}
              aria-label={`Collect now: ${place}`}
            >
              Collect now
            </Button>
          )}
          {mayChange && (
            <Button size="sm" onClick={() => setDoing('change')} aria-label={`Change: ${place}`}>
              Change
            </Button>
          )}
          {mayChange && (
            <Button size="sm" onClick={() => setDoing('retire')} aria-label={`Retire: ${place}`}>
              Retire
            </Button>
          )}
        </Stack>
      )}
      {doing === 'retire' && <RetireSourceDialog source={source} onClose={stop} onRetired={onChanged} />}
    </Stack>
  );
}
