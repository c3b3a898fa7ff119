import coefficients from './default-model.json';
import type { LearnedRiding } from './model';

/**
 * What a workshop starts from, and what its own fit is drawn to while it has few riders. Learned by fitRidingModel from 16
 * public ride logs, by minimising the CRPS of the quantiles with a ridge on the coefficients; the widths were set on riders
 * left out of the fit. Coefficients and quantiles over all riders only: no log is in it. Made again by
 * `npm run backtest -- --logs DIR --write-defaults`.
 */
export const defaultRidingModel: LearnedRiding = coefficients;
