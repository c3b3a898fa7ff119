import type { RideGroup } from './history-rows';
import { shareOfRiding } from './share-of-riding';

const TODAY = 20_000;
const on = (chainId: string, km: number, change: Partial<RideGroup> & { day?: number } = {}): RideGroup => ({
  bikeId: 'b',
  chainId,
  inService: true,
  rides: [{ day: change.day ?? TODAY - 10, km, surface: 'road', weather: 'dry' }],
  ...change,
});
const share = (...groups: RideGroup[]) => shareOfRiding({ id: 'a', inServiceOn: TODAY - 300 }, groups, TODAY);

it('is all of the riding without rotation, and for a chain of which little is known', () => {
  expect(share(on('a', 500))).toBe(1);
  expect(share(on('a', 10), on('b', 20))).toBe(1);
});

it('is the part ridden on this chain where others take turns', () => {
  expect(share(on('a', 300), on('b', 100))).toBe(0.75);
});

it('leaves out what came before the chain, and what retired chains carried', () => {
  expect(share(on('a', 300), on('b', 900, { day: TODAY - 301 }))).toBe(1);
  expect(share(on('a', 300), on('b', 900, { inService: false }))).toBe(1);
});
