import { randomBytes } from 'node:crypto';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { passwordResetTokens, people } from '../../db/schema';
import { sha256Hex } from '../../http/sha256';
import type { JobData } from '../../jobs/job-port';
import type { MailPort } from '../../mail/mail-port';

const LINK_LIFE_MS = 60 * 60_000;

/**
 * The job behind a forgotten password. The token is made here and not before, so that no queue ever holds it; each
 * try makes its own, and the links of earlier tries stay good until one is used.
 */
export async function sendResetMail(
  { db, mail, publicUrl }: { db: Database; mail: MailPort; publicUrl: string },
  { user_id: userId, reset_id: resetId }: JobData['send-password-reset'],
): Promise<void> {
  const [person] = await db.select().from(people).where(eq(people.userId, userId));
  if (!person) return;
  const token = randomBytes(32).toString('base64url');
  const expiresAt = new Date(Date.now() + LINK_LIFE_MS);
  await db.insert(passwordResetTokens).values({ tokenSha256: sha256Hex(token), userId, expiresAt });
  await mail.send({
    to: { name: person.name, address: person.email },
    subject: 'A new password for Larderline',
    text: [
      `Hello ${person.name},`,
      '',
      'open this link within an hour to choose a new password:',
      `${publicUrl}/reset-password?token=${token}`,
      '',
      'If you did not ask for it, do nothing: the old password stays.',
      '',
    ].join('\n'),
    messageId: `<password-reset.${resetId}@${new URL(publicUrl).hostname}>`,
  });
}
