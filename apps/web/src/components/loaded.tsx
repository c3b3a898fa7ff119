import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ErrorState } from './error-state';
import { LoadingState } from './loading-state';

interface LoadedProps<T> {
  query: UseQueryResult<T>;
  /** Grey places shown meanwhile. */
  rows?: number;
  height?: string;
  children: (data: T) => ReactNode;
}

/** What was read, or that it is on its way, or why it did not come and the way to try again. */
export function Loaded<T>({ query, rows, height, children }: LoadedProps<T>) {
  if (query.data !== undefined) return children(query.data);
  if (query.error) return <ErrorState error={query.error} onRetry={() => void query.refetch()} />;
  return <LoadingState rows={rows} height={height} />;
}
