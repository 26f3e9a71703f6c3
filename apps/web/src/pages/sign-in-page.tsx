import { EntryFrame } from '../features/auth/components/entry-frame';
import { SignInForm } from '../features/auth/components/sign-in-form';
import { useArrive } from '../features/auth/use-arrive';

/** The way in for staff. */
export function SignInPage() {
  const arrive = useArrive();
  return (
    <EntryFrame title="Sign in">
      <SignInForm onSignedIn={arrive} />
    </EntryFrame>
  );
}
