import { useState } from 'react';
import type { SubmitEvent } from 'react';
import type { z } from 'zod';
import { errorSentence } from '../../app/api-problem';

/** What is wrong, by field; under '' what concerns the whole form. */
type Wrong = Record<string, string>;

/**
 * A form of a field or two on the first page, which does without the form library to open fast.
 * @param send what to do with values that fit the schema; what it throws is told in a sentence.
 */
export function usePlainForm<O>(schema: z.ZodType<O>, send: (values: O) => Promise<unknown>) {
  const [wrong, setWrong] = useState<Wrong>({});
  const [busy, setBusy] = useState(false);
  const onSubmit = async (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const given = schema.safeParse(Object.fromEntries(new FormData(form)));
    if (!given.success) {
      const found = given.error.issues.map(({ path, message }) => [String(path[0] ?? ''), message] as const);
      setWrong(Object.fromEntries(found.reverse()));
      form.querySelector<HTMLInputElement>(`[name="${found.at(-1)?.[0]}"]`)?.focus();
      return;
    }
    setWrong({});
    setBusy(true);
    try {
      await send(given.data);
    } catch (error) {
      setWrong({ '': errorSentence(error) });
    } finally {
      setBusy(false);
    }
  };
  return { wrong, busy, onSubmit };
}
