import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';

/** One value of a page kept in its address, so that back, reload and a sent link keep it. */
export function useUrlState(name: string, fallback = ''): [string, (value: string) => void] {
  const [params, setParams] = useSearchParams();
  const set = useCallback(
    (value: string) =>
      setParams(
        (before) => {
          const next = new URLSearchParams(before);
          if (value === fallback) next.delete(name);
          else next.set(name, value);
          if (name !== 'page') next.delete('page');
          return next;
        },
        { replace: name !== 'page' },
      ),
    [name, fallback, setParams],
  );
  return [params.get(name) ?? fallback, set];
}

/** The page of a list that is shown, from 1, and the way to another. */
export function usePageNumber(): [number, (page: number) => void] {
  const [page, set] = useUrlState('page', '1');
  return [Math.max(1, Math.trunc(Number(page)) || 1), useCallback((to: number) => set(String(to)), [set])];
}
