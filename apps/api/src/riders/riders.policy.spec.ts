import { mayReachRider, ridersInReach } from './riders.policy';

const rider = { role: 'rider', riderId: 'a' } as const;
const staff = (['mechanic', 'desk', 'owner'] as const).map((role) => ({ role, riderId: null }));

describe('who reaches which rider', () => {
  it('a rider only themself', () => {
    expect(mayReachRider(rider, 'a')).toBe(true);
    expect(mayReachRider(rider, 'b')).toBe(false);
  });

  it('staff everybody', () => {
    for (const actor of staff) expect(mayReachRider(actor, 'b')).toBe(true);
  });
});

describe('the rider a list is limited to', () => {
  it('is always a rider themself, and nobody when they ask for another', () => {
    expect(ridersInReach(rider)).toBe('a');
    expect(ridersInReach(rider, 'a')).toBe('a');
    expect(['a', 'b', undefined]).not.toContain(ridersInReach(rider, 'b'));
    expect(ridersInReach({ role: 'rider', riderId: null })).toBeDefined();
  });

  it('is for staff the one they ask for, or none', () => {
    for (const actor of staff) {
      expect(ridersInReach(actor, 'b')).toBe('b');
      expect(ridersInReach(actor)).toBeUndefined();
    }
  });
});
