import { SMTPServer } from 'smtp-server';
import { newId } from '../db/new-id';
import { readPlainMail } from './read-plain-mail';

export interface SunkMail {
  id: string;
  receivedAt: Date;
  to: string;
  subject: string;
  text: string;
  messageId: string;
}

export interface MailSink {
  smtpUrl: string;
  /** Newest first. */
  list: () => readonly SunkMail[];
  close: () => Promise<void>;
}

const MOST_KEPT = 200;
const MOST_BYTES = 1_000_000;

/**
 * A mail server on loopback that delivers nowhere: demo mode shows what it took. Kept in memory only, because the
 * links in it are keys and a dump of the database must hold none.
 */
export async function startMailSink(): Promise<MailSink> {
  const kept: SunkMail[] = [];
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: MOST_BYTES,
    logger: false,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const mail = readPlainMail(Buffer.concat(chunks));
        const to = session.envelope.rcptTo.map((recipient) => recipient.address).join(', ');
        // A repeat of one message (same Message-ID) replaces the earlier one, as a mailbox would.
        const earlier = kept.findIndex((one) => one.messageId !== '' && one.messageId === mail.messageId);
        if (earlier >= 0) kept.splice(earlier, 1);
        kept.unshift({ id: newId(), receivedAt: new Date(), to, ...mail });
        kept.length = Math.min(kept.length, MOST_KEPT);
        done();
      });
    },
  });
  server.on('error', () => undefined);
  const port = await new Promise<number>((resolve, reject) => {
    const listening = server.listen(0, '127.0.0.1', () => {
      const address = listening.address();
      if (typeof address === 'object' && address) resolve(address.port);
      else reject(new Error('The mail sink has no port.'));
    });
    listening.once('error', reject);
  });
  return {
    smtpUrl: `smtp://127.0.0.1:${port}`,
    list: () => kept,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
