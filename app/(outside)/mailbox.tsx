export { MailboxScreen as default } from '../../src/features/mailbox/mailbox-screen';
