import { mayReachBike } from './bikes.policy';

it('opens a bike to its own rider and to staff, and to no other rider', () => {
  const bike = { riderId: 'a' };
  expect(mayReachBike({ role: 'rider', riderId: 'a' }, bike)).toBe(true);
  expect(mayReachBike({ role: 'rider', riderId: 'b' }, bike)).toBe(false);
  expect(mayReachBike({ role: 'rider', riderId: null }, bike)).toBe(false);
  for (const role of ['mechanic', 'desk', 'owner'] as const)
    expect(mayReachBike({ role, riderId: null }, bike)).toBe(true);
});
