import { useParams } from 'react-router-dom';
import { Loaded } from '../components/states/loaded';
import { useLink } from '../features/auth/api';
import { EntryFrame } from '../features/auth/components/entry-frame';
import { FirstAdministratorForm } from '../features/auth/components/first-administrator-form';
import { InvitationForm } from '../features/auth/components/invitation-form';
import { useArrive } from '../features/auth/use-arrive';

const TITLES = {
  'first-administrator': 'The first administrator',
  invitation: 'Welcome',
  password: 'A new password',
} as const;

/** Where one-time links lead: the first administrator's, an invitation, a new password. */
export function WelcomePage() {
  const { token = '' } = useParams();
  const link = useLink(token);
  const arrive = useArrive();
  return (
    <EntryFrame title={link.data ? TITLES[link.data.purpose] : 'Welcome'}>
      <Loaded from={link} what="what this link is for">
        {(view) =>
          view.purpose === 'first-administrator' ? (
            <FirstAdministratorForm token={token} onSignedIn={arrive} />
          ) : (
            <InvitationForm token={token} link={view} onSignedIn={arrive} />
          )
        }
      </Loaded>
    </EntryFrame>
  );
}
