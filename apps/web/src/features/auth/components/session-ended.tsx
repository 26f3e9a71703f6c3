import { useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { useSWRConfig } from 'swr';
import { startOf } from '../../../app/paths';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { onSessionEnded } from '../../../lib/api/session-ended';
import type { Me } from '../../../lib/api/types';
import { ME, useMe } from '../../../lib/api/use-me';
import { SignInForm } from './sign-in-form';

/**
 * When the session ends under somebody's hands: asks for the password over the page, which stays as it is with all that
 * was typed. Somebody else signing in there gets a page of their own.
 */
export function SessionEnded() {
  const { me } = useMe();
  const [before, setBefore] = useState<Me | null>();
  const [open, setOpen] = useState(false);
  const { mutate } = useSWRConfig();
  const navigate = useNavigate();
  if (me && me !== before) setBefore(me);
  useEffect(() => onSessionEnded(() => setOpen(true)), []);

  const goOn = async (now: Me) => {
    setOpen(false);
    await mutate(ME, now, { revalidate: false });
    if (before && now.id !== before.id) await navigate(startOf[now.role]);
    await mutate((key) => key !== ME);
  };
  return (
    <Dialog
      open={open && before != null}
      onClose={() => setOpen(false)}
      title="You have been signed out"
      footer={<Button onClick={() => setOpen(false)}>Look at the page first</Button>}
      grave
    >
      <p>Sign in to go on. Nothing on the page behind is lost.</p>
      <SignInForm email={before?.email} onSignedIn={goOn} />
    </Dialog>
  );
}
