/** A label for the next chain: 'Chain C' where there are two. */
export function nextLabel(taken: readonly { label: string }[]): string {
  const labels = new Set(taken.map(({ label }) => label.trim().toLowerCase()));
  for (let i = taken.length; ; i++) {
    const label = `Chain ${i < 26 ? String.fromCharCode(65 + i) : i + 1}`;
    if (!labels.has(label.toLowerCase())) return label;
  }
}
