import { wrongTreatmentDay } from './treatments.policy';

it('takes a treatment of any day in service, up to today', () => {
  const chain = { inServiceOn: '2026-03-01', retiredOn: '2026-10-01' };
  expect(wrongTreatmentDay('2026-03-01', chain, '2026-12-01')).toBeNull();
  expect(wrongTreatmentDay('2026-02-28', chain, '2026-12-01')).toContain('went into service');
  expect(wrongTreatmentDay('2026-10-02', chain, '2026-12-01')).toContain('retired');
  expect(wrongTreatmentDay('2026-12-02', chain, '2026-12-01')).toContain('still to come');
});
