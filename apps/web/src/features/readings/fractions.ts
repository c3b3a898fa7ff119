/** The finest line of a common steel rule, of an inch. */
const FINEST = 64;
/** As far beyond 12 inches as a chain that still runs can be: 1.6 %. */
const MOST = 12;

function lowest(part: number): string {
  let [top, bottom] = [part, FINEST];
  while (top % 2 === 0 && bottom > 1) [top, bottom] = [top / 2, bottom / 2];
  return `${top}/${bottom}`;
}

/** Where the pin may stand beyond the 12-inch line: inches as kept and as the rule is read. */
export const fractions: { value: string; label: string }[] = [
  { value: '0', label: 'on the line' },
  ...Array.from({ length: MOST }, (_, i) => ({
    value: String((i + 1) / FINEST),
    label: `${lowest(i + 1)} in beyond`,
  })),
];
