import { readFileSync } from 'node:fs';
import { inRoot } from './root.mjs';

/** Prints where everything is and, with the demo, who can sign in. */
export function printWelcome(env) {
  const lines = [
    '',
    `Lidwatch runs:    http://localhost:${env.PORT}`,
    `Local inbox:      ${env.LOCAL_SERVICES_URL} (every mail and text it sends)`,
  ];
  if (env.DEMO.toLowerCase() === 'on') {
    const { staff, password } = JSON.parse(readFileSync(inRoot('fixtures/demo/staff.json'), 'utf8'));
    const role = ({ role, districts = [] }) =>
      districts.length > 0 ? `${role}, ${districts.join(' and ')}` : role;
    lines.push('', `Demo sign-ins (password for all: ${password}):`);
    for (const person of staff) lines.push(`  ${person.email.padEnd(36)} ${person.name} (${role(person)})`);
  }
  lines.push('', 'Ctrl-C stops it all.');
  console.log(lines.join('\n'));
}
