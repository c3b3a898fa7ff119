import { useRef } from 'react';
import { v7 } from 'uuid';

/** Gives the same key for the same contents until they were accepted, so that a second try is not a second entry. */
export function useOnceKey() {
  const kept = useRef({ contents: '', key: '' });
  return {
    keyFor: (body: unknown): string => {
      const contents = JSON.stringify(body);
      if (kept.current.contents !== contents) kept.current = { contents, key: v7() };
      return kept.current.key;
    },
    accepted: () => {
      kept.current = { contents: '', key: '' };
    },
  };
}
