import type { Surface, WorkshopSettings } from '@halfpitch/contracts';

const figures = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 2 });

/** A factor as it is read: '1.5 ×'. */
export const times = (factor: number): string => `${figures.format(factor)} ×`;

type Factors = WorkshopSettings['factors'];

/** What so many kilometres count for under these factors, whole km. */
export function countedFor(
  km: number,
  factors: Factors,
  surface: Surface,
  weather: keyof Factors['weather'],
) {
  const [ground, sky] = [factors.surface[surface], factors.weather[weather]];
  return { lube: Math.round(km * ground.lube * sky.lube), wear: Math.round(km * ground.wear * sky.wear) };
}
