import { and, count, eq, gt, min, or } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { attempts } from '../../db/schema';
import { AppError } from '../../http/app-error';
import { sha256Hex } from '../../http/sha256';

type AttemptKind = 'sign_in' | 'password_reset';

const WINDOW_MS = 15 * 60_000;
/** Within the window. A family behind one network address shares its limit, hence the wider one. */
const LIMITS = {
  sign_in: { perEmail: 8, perNetworkAddress: 60 },
  password_reset: { perEmail: 4, perNetworkAddress: 30 },
} as const satisfies Record<AttemptKind, unknown>;

interface Attempt {
  kind: AttemptKind;
  email: string;
  networkAddress: string;
}

/** An attempt that was counted, to be forgotten when it succeeds. */
export interface CountedAttempt {
  kind: AttemptKind;
  emailSha256: string;
  networkAttemptId: string;
}

/**
 * Writes the attempt down before it is made, so that many at once are all counted, then refuses it when there were
 * too many: for this e-mail address or from this network address. Both stand there as SHA-256 and are purged.
 */
export async function countAttempt(
  db: Database,
  { kind, email, networkAddress }: Attempt,
): Promise<CountedAttempt> {
  const emailSha256 = sha256Hex(`email ${email.toLowerCase()}`);
  const networkSha256 = sha256Hex(`network ${networkAddress}`);
  const networkAttemptId = newId();
  await db.insert(attempts).values([
    { id: newId(), kind, subjectSha256: emailSha256 },
    { id: networkAttemptId, kind, subjectSha256: networkSha256 },
  ]);
  await refuseBeyond(db, { kind, sha256: emailSha256, limit: LIMITS[kind].perEmail });
  await refuseBeyond(db, { kind, sha256: networkSha256, limit: LIMITS[kind].perNetworkAddress });
  return { kind, emailSha256, networkAttemptId };
}

async function refuseBeyond(
  db: Database,
  { kind, sha256, limit }: { kind: AttemptKind; sha256: string; limit: number },
) {
  const since = new Date(Date.now() - WINDOW_MS);
  const [found] = await db
    .select({ made: count(), firstAt: min(attempts.at) })
    .from(attempts)
    .where(and(eq(attempts.kind, kind), eq(attempts.subjectSha256, sha256), gt(attempts.at, since)));
  if (found && found.made > limit) throw tooManyAttempts(found.firstAt);
}

/** After a success: this person's slips no longer count; those of others from the same place still do. */
export async function forgetAttempts(db: Database, counted: CountedAttempt): Promise<void> {
  const isOfPerson = and(eq(attempts.kind, counted.kind), eq(attempts.subjectSha256, counted.emailSha256));
  await db.delete(attempts).where(or(isOfPerson, eq(attempts.id, counted.networkAttemptId)));
}

function tooManyAttempts(firstAt: Date | null): AppError {
  const elapsedMs = firstAt === null ? 0 : Date.now() - new Date(firstAt).getTime();
  const retryAfterS = Math.max(1, Math.ceil((WINDOW_MS - elapsedMs) / 1000));
  const minutes = Math.ceil(retryAfterS / 60);
  return new AppError('too_many_requests', `Too many attempts. Try again in ${minutes} min.`, {
    retryAfterS,
  });
}
