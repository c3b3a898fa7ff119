import { elongationFromInches } from '@halfpitch/estimation';

/** Marks of a rule past 12 inches over 24 pitches. 1/16 in is 0.5208 %, 1/8 in 1.0417 % (computed). */
export const ruleMarks = [
  { label: 'At 12 in', pct: 0 },
  ...[
    ['1/32 in past', 1 / 32],
    ['1/16 in past', 1 / 16],
    ['3/32 in past', 3 / 32],
    ['1/8 in past', 1 / 8],
  ].map(([label, inches]) => ({
    label: String(label),
    pct: Number(elongationFromInches(Number(inches)).toFixed(3)),
  })),
];
