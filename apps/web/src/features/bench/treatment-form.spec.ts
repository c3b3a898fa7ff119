import { describe, expect, it } from 'vitest';
import { treatmentForm } from './treatment-form';
import type { TreatmentForm } from './treatment-form';

const filled = (change: Partial<TreatmentForm> = {}): TreatmentForm => ({
  chainId: '018f0000-0000-7000-8000-000000000001',
  day: '2026-03-04',
  kind: 're-wax',
  arrival: 'dry',
  notes: '',
  reading: { method: 'none', values: [null], step: null },
  ...change,
});
const wrongWith = (form: TreatmentForm) =>
  treatmentForm.safeParse(form).error?.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);

describe('the form of a treatment', () => {
  it('sends no reading when nothing was measured', () => {
    expect(treatmentForm.parse(filled()).reading).toBeNull();
  });

  it('leaves out places that were not measured', () => {
    const reading = { method: 'three-point' as const, values: [0.31, null, 0.36], step: null };
    expect(treatmentForm.parse(filled({ reading })).reading).toMatchObject({ values: [0.31, 0.36] });
  });

  it('turns a drop-in answer into an interval', () => {
    const reading = { method: 'drop-in' as const, values: [null], step: 'half' };
    expect(treatmentForm.parse(filled({ reading })).reading).toEqual({
      method: 'drop-in',
      values: null,
      lower: 0.5,
      upper: 0.75,
    });
  });

  it('asks for what the tool shows when only the tool was chosen', () => {
    for (const method of ['drop-in', 'digital'] as const)
      expect(wrongWith(filled({ reading: { method, values: [null], step: null } }))).toEqual([
        'reading.values: Enter what the tool shows.',
      ]);
  });

  it('says how the chain arrived must be told, and what is no number', () => {
    expect(wrongWith(filled({ arrival: undefined }))).toEqual(['arrival: Say how the chain arrived.']);
    const reading = { method: 'digital' as const, values: [NaN], step: null };
    expect(wrongWith(filled({ reading }))).toEqual(['reading.values.0: Elongation is a number in %.']);
  });
});
