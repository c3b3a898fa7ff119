import { dayWords, distance, instantWords, money, relativeDay, windowWords } from './format';
import { useSession } from './session';

type Window = Parameters<typeof windowWords>[0];

/** Figures and days as this person and workshop write them. */
export function useFormat() {
  const { preferences, workshop } = useSession();
  const { today, timeZone, currency } = workshop;
  const unit = preferences.distanceUnit;
  return {
    unit,
    today,
    distance: (metres: number) => distance(metres, unit),
    day: (day: string) => dayWords(day, today),
    relativeDay: (day: string) => relativeDay(day, today),
    window: (window: Window) => windowWords(window, today),
    instant: (instant: string) => instantWords(instant, timeZone),
    money: (minor: number) => money(minor, currency),
  };
}
