/**
 * Elongation, %, at which a chain is replaced so that it spares the sprockets: 0.5 from 11 speeds on, 0.75 for 6 to 10,
 * 1.0 for single-speed and hub gear. Common practice (shop pages, facts of the trade); e-bikes go by their speeds.
 */
export function defaultWearLimitPct(speeds: number): number {
  if (speeds >= 11) return 0.5;
  return speeds >= 6 ? 0.75 : 1;
}
