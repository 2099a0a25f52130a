import { queryOptions, useQuery } from '@tanstack/react-query';
import { settingsSchema } from '../../model/contracts/mail';
import { call } from './api';

export const settingsQuery = queryOptions({
  queryKey: ['settings'],
  queryFn: ({ signal }) => call(settingsSchema, '/api/settings', { signal }),
  staleTime: Infinity,
});

/** What this server is: whether it shows its own mail, and whether demo sites are there. */
export function useSettings() {
  return useQuery(settingsQuery);
}
