import { hash, verify } from '@node-rs/argon2';

/** argon2id is what the package makes by default; the cost is OWASP's first choice: 19 MiB, two passes, one lane. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

let nobodysHash: Promise<string> | undefined;

/** Takes as long for an address nobody has, so that time does not tell which addresses exist. */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword('the password of nobody');
  const isRight = await verify(passwordHash ?? (await nobodysHash), password);
  return isRight && passwordHash !== undefined;
}
