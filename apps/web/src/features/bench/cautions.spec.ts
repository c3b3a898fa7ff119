import { treatmentChoices } from '@halfpitch/contracts';
import { describe, expect, it } from 'vitest';
import { cautionsFor } from './cautions';

const about = (kind: (typeof treatmentChoices.options)[number]) => cautionsFor(kind).map((one) => one.about);

describe('cautions at the bench', () => {
  it.each(treatmentChoices.options)('always defers to the maker, and guards the brakes: %s', (kind) => {
    expect(about(kind)).toEqual(expect.arrayContaining(['Brakes', 'Always']));
  });

  it.each(['strip-wax', 're-wax'] as const)('warns of hot wax before all else: %s', (kind) => {
    expect(about(kind).slice(0, 4)).toEqual(['Hot wax', 'Wet chain', 'Wax fire', 'Burns']);
  });

  it('does not cry hot wax over a drip or an oil', () => {
    for (const kind of ['drip-top-up', 'oil-wet', 'oil-dry'] as const)
      expect(about(kind)).not.toContain('Hot wax');
  });
});
