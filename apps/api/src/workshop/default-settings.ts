import { defaultFleetModel } from '@halfpitch/estimation';
import type { StoredSettings } from './workshop.entity';

/** What a new workshop starts from; every figure is its owner's to change. */
export function defaultSettings(): StoredSettings {
  const { surface, weather, wetShareByMonth } = defaultFleetModel().factors;
  return {
    factors: { surface, weather, wetShareByMonth: [...wetShareByMonth] },
    calendarLimitDays: { 'immersion-wax': null, 'drip-wax': null, 'wet-oil': 31, 'dry-oil': 31 },
    reminderPolicy: { days: 14, chance: 0.5, lubrication: true, replacement: true },
    bench: { minutesPerWeek: 1200, minutesPerTreatment: 25, minutesPerReplacement: 30, chainsPerPotLoad: 6 },
  };
}
