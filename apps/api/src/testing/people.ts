import type { Role } from '@lidwatch/contracts';
import type { Server } from 'node:http';
import request, { type Agent } from 'supertest';
import { InvitationsService } from '../auth/accounts/invitations.service';
import { LinksService } from '../auth/accounts/links.service';
import type { TestApp } from './test-app';

/** The password of everybody in tests. */
export const testPassword = 'a quiet winter morning';
let made = 0;

/** Somebody signed in: requests go with their session. */
export interface SignedInAgent {
  http: Agent;
  id: number;
  email: string;
  name: string;
}

/** Makes an account by invitation and accepts it; returns its id and e-mail. */
export async function makeUser(
  { app }: TestApp,
  role: Role,
  districts: number[] = [],
): Promise<Omit<SignedInAgent, 'http'>> {
  const n = ++made;
  const wanted = {
    email: `${role}${n}@pellworth.example`,
    name: `Test ${role} ${n}`,
    role,
    districtIds: districts,
  };
  const { user, invitationUrl } = await app
    .get(InvitationsService, { strict: false })
    .invite(wanted, 'service');
  const token = invitationUrl.split('/').at(-1) ?? '';
  await app.get(LinksService, { strict: false }).acceptLink({ token, password: testPassword });
  return { id: user.id, email: user.email, name: user.name };
}

/** Makes somebody of a role (an officer with districts) and signs them in through the API. */
export async function signInAs(
  test: TestApp,
  role: Role,
  { districts = [] }: { districts?: number[] } = {},
): Promise<SignedInAgent> {
  const user = await makeUser(test, role, districts);
  const http = request.agent(test.app.getHttpServer() as Server);
  await http.post('/api/auth/sign-in').send({ email: user.email, password: testPassword }).expect(200);
  return { ...user, http };
}
