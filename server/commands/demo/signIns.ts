/** What the start command prints: who can be tried. */
import { demoPassword, demoPeople } from './people';

export function printSignIns(): void {
  console.log(`\nDemo sign-ins, all with the password "${demoPassword}":`);
  for (const { name, email, roles } of demoPeople) {
    const held = [...new Set(roles.map(({ role }) => role))].join(', ');
    console.log(`  ${email.padEnd(28)} ${name.padEnd(14)} ${held}`);
  }
}
