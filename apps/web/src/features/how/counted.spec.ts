import { describe, expect, it } from 'vitest';
import { equivalentKm, defaultFleetModel } from '@halfpitch/estimation';
import { countedFor, times } from './counted';

describe('the example of how kilometres count', () => {
  const { factors } = defaultFleetModel();
  const given = { ...factors, wetShareByMonth: [...factors.wetShareByMonth] };

  it('says the same as the estimate itself', () => {
    const ride = { day: 20_000, km: 40, surface: 'gravel', weather: 'wet' } as const;
    const { lubeKm, wearKm } = equivalentKm(ride, factors);
    expect(countedFor(40, given, 'gravel', 'wet')).toEqual({
      lube: Math.round(lubeKm),
      wear: Math.round(wearKm),
    });
  });

  it('writes factors without idle zeros', () => {
    expect([times(1), times(1.5), times(2.25)]).toEqual(['1 ×', '1.5 ×', '2.25 ×']);
  });
});
