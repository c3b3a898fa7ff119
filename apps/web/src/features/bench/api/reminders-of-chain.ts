import { reminderPage } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Letters about one chain, newest first; for those who may read them. */
export const remindersOfChainQuery = (chainId: string) =>
  queryOptions({
    queryKey: ['reminders', 'chain', chainId],
    queryFn: ({ signal }) =>
      request('/reminders', { schema: reminderPage, query: { chainId, size: 10 }, signal }),
  });
