export interface Mail {
  to: { name: string; address: string };
  subject: string;
  text: string;
  /** Stays the same when a job is tried again, so that a mailbox can tell a repeat. */
  messageId: string;
}

export interface MailPort {
  send: (mail: Mail) => Promise<void>;
  close: () => void;
}
