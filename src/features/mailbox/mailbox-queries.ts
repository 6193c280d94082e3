import { queryOptions } from '@tanstack/react-query';
import { fetchDemoMailbox } from '../../session/session-requests';

export function mailboxQuery() {
  return queryOptions({ queryKey: ['demo-mailbox'], queryFn: fetchDemoMailbox, staleTime: 0 });
}
