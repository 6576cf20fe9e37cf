/** The demo people's sign-ins, as the start prints them. */
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Lines to print; none when the demo shop was declined (BENCHLEAF_DEMO=no). */
export function demoSignIns(projectFolder) {
  if (process.env.BENCHLEAF_DEMO === 'no') return [];
  const path = join(projectFolder, 'db', 'seeders', 'demo-people.json');
  if (!existsSync(path)) return [];
  const { people, password } = JSON.parse(readFileSync(path, 'utf8'));
  return [
    `Demo sign-ins, all with the password ${password}:`,
    ...people.map(({ role, email }) => `  ${role.padEnd(10)} ${email}`),
  ];
}
