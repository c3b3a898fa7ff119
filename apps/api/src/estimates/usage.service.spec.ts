import { defaultFactors } from '@halfpitch/estimation';
import { usageCycles } from './usage.service';

const ride = (day: string, km: number, weather: 'dry' | 'wet' = 'dry') => ({
  day,
  metres: km * 1000,
  surface: 'road' as const,
  weather,
});

it('sums km and lube km by day and starts anew at each treatment', () => {
  const { cycles } = usageCycles(
    '2026-01-01',
    [{ id: 't', day: '2026-01-10', kind: 're-wax' }],
    [
      ride('2026-01-02', 30),
      ride('2026-01-02', 10, 'wet'),
      ride('2026-01-10', 20),
      ride('2026-01-11', 15, 'wet'),
    ],
    defaultFactors,
  );
  expect(cycles).toEqual([
    {
      treatmentId: null,
      kind: null,
      from: '2026-01-01',
      to: '2026-01-10',
      points: [
        { day: '2026-01-02', km: 40, lubeKm: 50 },
        { day: '2026-01-10', km: 60, lubeKm: 70 },
      ],
    },
    {
      treatmentId: 't',
      kind: 're-wax',
      from: '2026-01-10',
      to: null,
      points: [{ day: '2026-01-11', km: 15, lubeKm: 30 }],
    },
  ]);
});
