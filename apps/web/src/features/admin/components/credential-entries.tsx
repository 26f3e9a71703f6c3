import { useFormContext } from 'react-hook-form';
import { ChoiceEntry, EntryGrid, TextEntry } from '../../../components/form';
import type { Source } from '../types';
import type { SourceEntries } from './source-entries';

const AUTHS = [
  { value: 'none', label: 'nothing' },
  { value: 'basic', label: 'a name and a password' },
  { value: 'bearer', label: 'a token' },
];

/** An address and what it asks for. Kept credentials are never shown; empty fields keep them. */
export function CredentialEntries({ source }: { source: Source | undefined }) {
  const { watch } = useFormContext<SourceEntries>();
  const [auth, url] = [watch('auth'), watch('url')];
  const kept = source?.hasSecret && source.auth === auth;
  const help = kept ? 'Kept. Leave empty to keep it.' : 'Kept sealed, and never shown again';
  const isOpen = auth !== 'none' && /^http:/i.test(url);
  return (
    <>
      <TextEntry
        name="url"
        label="Address of the file"
        help="Such as https://loggers.example.org/mast.csv, without any password"
        required
      />
      <EntryGrid>
        <ChoiceEntry
          name="auth"
          label="It asks for"
          choices={AUTHS}
          help={isOpen ? 'This address is http: they travel without encryption.' : undefined}
        />
        {auth === 'basic' && <TextEntry name="username" label="Name" help={help} required={!kept} />}
        {auth === 'basic' && (
          <TextEntry
            name="password"
            label="Password"
            type="password"
            autoComplete="new-password"
            help={help}
            required={!kept}
          />
        )}
        {auth === 'bearer' && (
          <TextEntry
            name="token"
            label="Token"
            type="password"
            autoComplete="new-password"
            help={help}
            required={!kept}
          />
        )}
      </EntryGrid>
    </>
  );
}
