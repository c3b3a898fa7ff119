/** Prior of a chain's wear rate: log-normal, median in % per 1,000 wear km. */
export interface RatePrior {
  median: number;
  logSd: number;
}

/** Log-normal prior of the run-in, %. */
export interface RunInPrior {
  median: number;
  logSd: number;
}

/**
 * Quick bedding-in of a new chain: under 0.1 % in its first hours (Tsubaki, Complete Guide to Chain, 2.2.4, read).
 * Median 0.025 %, 997 chains of 1,000 below 0.1 %.
 */
export const RUN_IN: RunInPrior = { median: 0.025, logSd: 0.5 };
