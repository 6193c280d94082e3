import { useQuery } from '@tanstack/react-query';
import { Text } from 'react-native';
import { describeError } from '../../api/describe-error';
import { isApiError } from '../../api/api-error';
import {
  Body,
  Button,
  EmptyState,
  FONTS,
  FailedState,
  LoadingState,
  Screen,
  Sheet,
  SIZES,
  useTheme,
} from '../../ui';
import { mailboxQuery } from './mailbox-queries';
import { messageTime, splitAtLinks } from './message-text';
import { LocalLink } from './components/local-link';

/** Demo mode only: what the product has sent by e-mail, newest first. */
export function MailboxScreen() {
  const mailbox = useQuery(mailboxQuery());
  const messages = mailbox.data ?? [];
  return (
    <Screen
      title="Mailbox"
      subtitle="Everything that was sent by e-mail from this machine. It exists in demo mode only."
      back={{ href: '/', label: 'Larderline' }}
      action={
        <Button
          label="Look again"
          onPress={() => void mailbox.refetch()}
          isBusy={mailbox.isFetching}
          busyLabel="Looking…"
        />
      }
    >
      {mailbox.isPending ? <LoadingState what="Fetching the mailbox" /> : null}
      {isApiError(mailbox.error, 'not_found') ? (
        <EmptyState title="No mailbox here">
          Outside demo mode messages go to the people they are addressed to.
        </EmptyState>
      ) : mailbox.isError ? (
        <FailedState
          {...describeError(mailbox.error, 'The mailbox could not be fetched')}
          onRetry={() => void mailbox.refetch()}
          isRetrying={mailbox.isFetching}
        />
      ) : null}
      {mailbox.isSuccess && messages.length === 0 ? (
        <EmptyState title="Nothing was sent so far">
          Ask for a new password, for instance, and its message will be here.
        </EmptyState>
      ) : null}
      {messages.map((message) => (
        <Sheet
          key={message.id}
          title={message.subject}
          subtitle={`to ${message.to} · ${messageTime(message.received_at)}`}
        >
          <MessageText text={message.text} />
        </Sheet>
      ))}
      {messages.length === 0 ? null : <Body tone="second">Newest first.</Body>}
    </Screen>
  );
}

function MessageText({ text }: { text: string }) {
  const { colors } = useTheme();
  return (
    <Text
      style={{
        fontFamily: FONTS.regular,
        fontSize: SIZES.body,
        lineHeight: Math.round(SIZES.body * 1.4),
        color: colors.ink,
        overflowWrap: 'anywhere',
      }}
    >
      {splitAtLinks(text).map((part, index) =>
        part.kind === 'link' ? <LocalLink key={index} address={part.text} /> : part.text,
      )}
    </Text>
  );
}
