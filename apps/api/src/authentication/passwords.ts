import { hash, verify } from '@node-rs/argon2';

/** argon2id with 19 MiB, two passes, one lane: the least that OWASP recommends, and what two cores can bear. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const atOnce = 4;
let running = 0;
const waiting: (() => void)[] = [];

/** At most four at a time, so that many sign-ins do not starve everything else. */
async function inTurn<Result>(work: () => Promise<Result>): Promise<Result> {
  if (running >= atOnce) await new Promise<void>((resolve) => waiting.push(resolve));
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize('NFKC'), cost));
}

const nobody = hash('nobody has this password', cost);

/** Whether a password fits a hash; for an unknown person the same work is done in vain, so that the time tells nothing. */
export async function passwordFits(password: string, passwordHash: string | null): Promise<boolean> {
  const fits = await inTurn(async () => verify(passwordHash ?? (await nobody), password.normalize('NFKC')));
  return fits && passwordHash !== null;
}
