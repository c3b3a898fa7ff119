import type { Regime, RetiredReason } from '@halfpitch/contracts';

/** What a chain falls due for, by how it is lubricated. */
export const dueWords: Record<Regime, string> = {
  'immersion-wax': 'Re-wax',
  'drip-wax': 'Drip top-up',
  'wet-oil': 'Clean and oil',
  'dry-oil': 'Clean and oil',
};

export const retiredWords: Record<RetiredReason, string> = {
  worn: 'Worn',
  broken: 'Broken',
  damaged: 'Damaged',
  sold: 'Sold',
  lost: 'Lost',
  other: 'Another reason',
};

export const speedWords = (speeds: number): string => (speeds === 1 ? 'single-speed' : `${speeds}-speed`);
