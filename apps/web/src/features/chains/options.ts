/** A list of the trade as options of a select field or of tiles. */
export const optionsOf = <V extends string>(words: Record<V, string>): { value: V; label: string }[] =>
  (Object.keys(words) as V[]).map((value) => ({ value, label: words[value] }));
