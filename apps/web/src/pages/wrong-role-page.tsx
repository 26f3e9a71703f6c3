import { startOf } from '../app/paths';
import { PageHead } from '../components/layout/page-head';
import { ButtonLink } from '../components/ui/button';
import { Message } from '../components/ui/message';
import type { Me, Role } from '../lib/api/types';

interface WrongRolePageProps {
  me: Me;
  /** Who the page is for. */
  roles: readonly Role[];
}

/** Said instead of a page that belongs to another role: whose it is, who one is, and the way to one's own. */
export function WrongRolePage({ me, roles }: WrongRolePageProps) {
  return (
    <>
      <PageHead title="Not your page" />
      <Message tone="warn" title={`This page is for the ${roles.join(' or the ')}.`}>
        <p>
          You are signed in as {me.name}, {me.role}. If you should see it, ask an administrator.
        </p>
      </Message>
      <ButtonLink to={startOf[me.role]} kind="go" mt="4">
        To my own work
      </ButtonLink>
    </>
  );
}
