import nodemailer from 'nodemailer';
import type { MailPort } from './mail-port';

/** Mail by SMTP; the address of the server holds user and password where it wants them. */
export function smtpMail({ smtpUrl, from }: { smtpUrl: string; from: string }): MailPort {
  const transport = nodemailer.createTransport(
    { url: smtpUrl, connectionTimeout: 5000, greetingTimeout: 5000, socketTimeout: 20_000 },
    { from },
  );
  return {
    async send({ to, subject, text, messageId }) {
      await transport.sendMail({ to, subject, text, messageId });
    },
    close: () => transport.close(),
  };
}
