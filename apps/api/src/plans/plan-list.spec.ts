import type { EstimateDetail } from '../estimates/estimate.entity';
import { PlanRow, toPlan } from './plan-list';

const flat = (chance: number) => Array.from({ length: 26 }, () => chance);
const row = (change: Partial<PlanRow> = {}, lubrication = flat(0.03)): PlanRow => ({
  id: '1',
  bikeId: '2',
  bikeName: 'Commuter',
  name: 'A training week',
  from: '2026-12-15',
  to: '2026-12-21',
  distanceM: 600_000,
  chainId: '3',
  chainLabel: 'A',
  madeOn: '2026-12-01',
  detail: {
    lubrication: { chanceNow: 0.01 },
    replacement: { chanceNow: 0 },
    weekly: { lubrication, replacement: flat(0.001) },
    treatment: { life: { p50: 300 } },
  } as EstimateDetail,
  ...change,
});

it('adds up the chances before the plan and by its end', () => {
  const { outlook } = toPlan(row(), '2026-12-01');
  expect(outlook!.lubrication.before).toBeCloseTo(0.06, 12);
  expect(outlook!.lubrication.byEnd).toBeCloseTo(0.09, 12);
  expect(outlook!.replacement.byEnd).toBeCloseTo(0.003, 12);
  expect(outlook).toMatchObject({ chainLabel: 'A', treatments: 2, comeInBy: null });
});

it('sends the rider in on the day before, and at once where the plan has begun', () => {
  const likely = row({}, flat(0.1));
  expect(toPlan(likely, '2026-12-01').outlook!.comeInBy).toBe('2026-12-14');
  expect(toPlan(likely, '2026-12-17').outlook!.comeInBy).toBe('2026-12-17');
});

it('says nothing where no chain is on the bike, nothing is estimated, or it lies too far ahead', () => {
  const silent = (change: Partial<PlanRow>) => expect(toPlan(row(change), '2026-12-01').outlook).toBeNull();
  silent({ chainId: null, chainLabel: null });
  silent({ detail: null, madeOn: null });
  silent({ from: '2027-07-01', to: '2027-07-05' });
});
