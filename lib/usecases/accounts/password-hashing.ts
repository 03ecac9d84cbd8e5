import { hash, verify } from '@node-rs/argon2';
import { TooManyTriesError } from '@/lib/errors';

/** argon2id (RFC 9106, its second recommended choice: 64 MiB, 3 passes), one lane. */
const settings = { algorithm: 2, memoryCost: 65_536, timeCost: 3, parallelism: 1 } as const;

/** Each takes 64 MiB and a core: at most so many at once, and at most so many waiting. */
const AT_ONCE = 4;
const MAY_WAIT = 64;

/** A hash with the same settings of a password nobody knows, so that an unknown e-mail takes as long. */
const nobodysHash = '$argon2id$v=19$m=65536,t=3,p=1$Xpl/liHRji8WLPDkWLrsSg$tb6ZbfoTEeEMPbThqnBDslcxVMzW+1Nw2DIDJQ7cZNE';

let running = 0;
const waiting: (() => void)[] = [];

export async function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize('NFKC'), settings));
}

/** Whether the password is right. Null for the hash: nobody by that name; takes as long and says no. */
export async function verifyPassword(passwordHash: string | null, password: string): Promise<boolean> {
  const right = await inTurn(() => verify(passwordHash ?? nobodysHash, password.normalize('NFKC')));
  return right && passwordHash !== null;
}

async function inTurn<Value>(work: () => Promise<Value>): Promise<Value> {
  if (running >= AT_ONCE) {
    if (waiting.length >= MAY_WAIT) throw new TooManyTriesError(60);
    await new Promise<void>((resolve) => waiting.push(resolve));
  } else {
    running += 1;
  }
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}
