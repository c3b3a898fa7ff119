/** Hands out batches of ids one after the other, each from where the last one ended, whoever asks. */
export function inTurn(batchAfter: (after?: string) => Promise<string[]>): () => Promise<string[]> {
  let after: string | undefined;
  let last: Promise<unknown> = Promise.resolve();
  return () => {
    const batch = last.then(() => batchAfter(after));
    last = batch.then((ids) => (after = ids.at(-1) ?? after));
    return batch;
  };
}
