import { queryOptions, useQuery } from '@tanstack/react-query';
import { localMailSchema } from '../../model/contracts/mail';
import { call } from './api';

export const mailboxQuery = queryOptions({
  queryKey: ['mail'],
  queryFn: async ({ signal }) => (await call(localMailSchema, '/api/mail', { signal })).messages,
  refetchInterval: 3000,
});

/** Mail caught by a local server instead of being sent. */
export function useMailbox() {
  return useQuery(mailboxQuery);
}
