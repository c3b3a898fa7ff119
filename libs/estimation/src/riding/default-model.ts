import coefficients from './default-model.json';
import type { LearnedRiding } from './model';

/**
 * What a workshop starts from: coefficients learned from public ride logs, no log among them. Made again by
 * `npm run backtest -- --logs DIR --write-defaults`.
 */
export const defaultRidingModel: LearnedRiding = coefficients;
