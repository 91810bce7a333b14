// The secrets of this installation: made at random once, kept in the data folder for its owner alone.
import { randomBytes, randomInt } from 'node:crypto';
import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** { tokenSecret, demoPassword }, read from `secrets.json` or made there. */
export function readOrMakeSecrets(dataDir) {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const file = path.join(dataDir, 'secrets.json');
  let known = {};
  try {
    known = JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    if (error.code !== 'ENOENT') throw new Error(`${file} cannot be read: ${error.message}`);
  }
  const secrets = {
    tokenSecret: randomBytes(48).toString('base64url'),
    demoPassword: readablePassword(),
    ...known,
  };
  if (JSON.stringify(secrets) !== JSON.stringify(known)) {
    writeFileSync(`${file}.new`, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
    renameSync(`${file}.new`, file);
  }
  return secrets;
}

// Four groups of four letters that are not mistaken for one another: about 70 bits, typed on a phone without pain.
function readablePassword() {
  const letters = 'abcdefghkmnpqrstuvwxyz';
  const group = () => Array.from({ length: 4 }, () => letters[randomInt(letters.length)]).join('');
  return [group(), group(), group(), group()].join('-');
}
