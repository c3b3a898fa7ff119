const colour = (name: string) => `var(--hp-colors-${name})`;

/** Colours for charts; they follow light and dark by themselves. */
export const chartColours = {
  line: colour('steel-solid'),
  band: colour('steel-muted'),
  axis: colour('fg-muted'),
  grid: colour('border'),
  ink: colour('fg'),
  limit: colour('dryness-dry'),
  fresh: colour('dryness-fresh'),
  turning: colour('dryness-turning'),
  dry: colour('dryness-dry'),
  ground: colour('bg-panel'),
} as const;

/** Writing on axes, px and family as elsewhere. */
export const chartText = { fontSize: 14, fill: chartColours.axis, fontFamily: 'inherit' } as const;
