import { hash, verify } from '@node-rs/argon2';

/** argon2id; memory in KiB. OWASP password storage cheat sheet: at least 19 MiB, two passes, one lane. */
const settings = { memoryCost: 19456, timeCost: 2, parallelism: 1 };
/** Hashing takes memory on purpose: only a few at a time, or sign-ins alone could fill the machine. */
const atOnce = 4;
let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= atOnce) await new Promise<void>((go) => waiting.push(go));
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

export const hashPassword = (password: string): Promise<string> => inTurn(() => hash(password, settings));

let nobodys: Promise<string> | null = null;

/** For an unknown account the same work is done, so that the time taken does not tell who has one. */
export async function passwordFits(passwordHash: string | null, password: string): Promise<boolean> {
  nobodys ??= hashPassword('nobody has this password');
  const against = passwordHash ?? (await nobodys);
  const fits = await inTurn(() => verify(against, password).catch(() => false));
  return fits && passwordHash !== null;
}
