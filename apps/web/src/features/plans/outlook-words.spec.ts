import { describe, expect, it } from 'vitest';
import { adviceWords, outlookWords } from './outlook-words';

const outlook = {
  chainId: '019af000-0000-7000-8000-000000000001',
  chainLabel: 'Road A',
  lubrication: { before: 0.12, byEnd: 0.93 },
  replacement: { before: 0, byEnd: 0.01 },
  treatments: 2.1,
  comeInBy: '2027-05-02',
};

describe('a plan’s outlook', () => {
  it('says how likely the chain is due, and how often a treatment is used up', () => {
    expect(outlookWords(outlook)).toBe(
      'Road A is due for its treatment by the end of it with a chance of 93 %, before it begins with 12 %. Even a fresh treatment is used up about 2 times on the way, more in the wet: plan to redo it.',
    );
    expect(outlookWords({ ...outlook, treatments: 0.4 })).not.toContain('fresh');
    expect(outlookWords({ ...outlook, replacement: { before: 0.1, byEnd: 0.4 } })).toContain(
      'replacement by then with a chance of 40 %',
    );
  });

  it('says when to come in', () => {
    expect(adviceWords(outlook, '2027-04-20')).toBe('Come in by 2 May.');
    expect(adviceWords(outlook, '2027-05-02')).toBe('Come in today.');
    expect(adviceWords({ comeInBy: null }, '2027-04-20')).toBe('The chain should last through it.');
  });
});
