import type { Reminder } from '@halfpitch/contracts';
import { describe, expect, it } from 'vitest';
import { choicesFor, newestBySubject } from './reminder-words';

const reminder = (id: string, kind: Reminder['kind'], createdAt: string): Reminder => ({
  id,
  chainId: 'chain',
  chainLabel: 'Road A',
  riderId: 'rider',
  riderName: 'Una Rider',
  email: 'una@example.org',
  bikeName: null,
  kind,
  state: 'sent',
  window: { p10: null, p50: null, p90: null },
  createdAt,
  sentAt: null,
  attempts: 1,
  lastError: null,
});

describe('reminders at the desk', () => {
  it('offers no second letter without asking for it as a second one', () => {
    expect(choicesFor('sent')).toEqual(['again']);
    expect(choicesFor('waiting')).not.toContain('write');
    expect(choicesFor('held')).toEqual(['release']);
    expect(choicesFor('none')).toEqual(['write', 'hold']);
  });

  it('keeps treatment and replacement apart, and the newest of each', () => {
    const of = newestBySubject([
      reminder('old', 'lubrication', '2026-01-01T00:00:00Z'),
      reminder('new', 'lubrication', '2026-02-01T00:00:00Z'),
      reminder('wear', 'replacement', '2026-03-01T00:00:00Z'),
    ]);
    expect(of({ chainId: 'chain', kind: 'lubrication' })?.id).toBe('new');
    expect(of({ chainId: 'chain', kind: 'replacement' })?.id).toBe('wear');
    expect(of({ chainId: 'another', kind: 'replacement' })).toBeUndefined();
  });
});
