/** Passwords and signing keys of one data folder: made on the first start, kept where only its owner can read them. */
import { chmodSync, existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { randomBytes } from 'node:crypto';
import { Fault, orFault } from './fault.mjs';

const NAMES = ['adminPassword', 'ownerPassword', 'appPassword', 'jwtSecret', 'cookieSecret'];

/** A new set: each is 32 random bytes in letters that need no quoting in an address. */
export function makeSecrets() {
  return Object.fromEntries(NAMES.map((name) => [name, randomBytes(32).toString('base64url')]));
}

/**
 * The secrets kept in the file, made when there is none.
 * @returns {{ secrets: Record<string, string>, fresh: boolean }}
 */
export function keepSecrets(path) {
  if (existsSync(path)) {
    let secrets;
    try {
      secrets = JSON.parse(orFault(`read ${path}`, () => readFileSync(path, 'utf8')));
    } catch (error) {
      if (error instanceof Fault) throw error;
    }
    if (!secrets || !NAMES.every((name) => typeof secrets[name] === 'string' && secrets[name] !== '')) {
      throw new Fault(
        `${path} is damaged. Put back a copy of it, or delete it: new passwords are then set and everybody signs in again.`,
      );
    }
    return { secrets, fresh: false };
  }
  const secrets = makeSecrets();
  orFault(`write ${path}`, () => {
    const unfinished = `${path}.unfinished`;
    writeFileSync(unfinished, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
    chmodSync(unfinished, 0o600);
    renameSync(unfinished, path);
  });
  return { secrets, fresh: true };
}
