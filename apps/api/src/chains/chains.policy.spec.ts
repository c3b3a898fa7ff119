import { mayFit, mayReachChain, mayRemoveChain } from './chains.policy';

it('opens a chain to its own rider and to staff, and to no other rider', () => {
  const chain = { riderId: 'a' };
  expect(mayReachChain({ role: 'rider', riderId: 'a' }, chain)).toBe(true);
  expect(mayReachChain({ role: 'rider', riderId: 'b' }, chain)).toBe(false);
  for (const role of ['mechanic', 'desk', 'owner'] as const)
    expect(mayReachChain({ role, riderId: null }, chain)).toBe(true);
});

it('lets a chain onto its own rider’s bikes only', () => {
  expect(mayFit({ riderId: 'a' }, { riderId: 'a' })).toBe(true);
  expect(mayFit({ riderId: 'a' }, { riderId: 'b' })).toBe(false);
});

it('keeps a treated chain from being removed by its rider', () => {
  expect(mayRemoveChain({ role: 'rider' }, true)).toBe(false);
  expect(mayRemoveChain({ role: 'rider' }, false)).toBe(true);
  expect(mayRemoveChain({ role: 'owner' }, true)).toBe(true);
});
