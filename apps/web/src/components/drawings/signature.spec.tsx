import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { renderOnPage } from '../../test-page';
import { DueWindow } from './due-window';
import { Rule, ruleWords } from './rule';

const today = '2026-03-02';

describe('the rule', () => {
  it('says elongation, its band and its limit', () => {
    renderOnPage(<Rule value={0.38} limit={0.5} band={{ p10: 0.31, p90: 0.46 }} label="Chain A" />);
    const name = 'Chain A: 0.38 % longer than new (between 0.31 % and 0.46 %), of the allowed 0.50 %';
    expect(screen.getByRole('img', { name })).toBeDefined();
  });

  it('says when the limit is passed, and takes a chain that measures shorter than new', () => {
    expect(ruleWords({ value: 0.5, limit: 0.5 })).toBe('0.50 % longer than new, past its limit of 0.50 %');
    expect(ruleWords({ value: 0.01, limit: 0.5, band: { p10: -0.03, p90: 0.05 } })).toContain('−0.03 %');
    renderOnPage(<Rule value={-0.04} limit={0.75} bare />);
    expect(screen.getByRole('img')).toBeDefined();
  });
});

describe('the due window', () => {
  it('says the window and the booking', () => {
    renderOnPage(
      <DueWindow
        p10="2026-03-11"
        p50="2026-03-17"
        p90="2026-03-24"
        today={today}
        appointment="2026-03-14"
        label="Re-wax"
      />,
    );
    const name = 'Re-wax: likely 11–24 March, most likely 17 March, booked for 14 March';
    expect(screen.getByRole('img', { name })).toBeDefined();
    expect(screen.getByText('booked')).toBeDefined();
  });

  it('stands without an end, without a median and without anything in two years', () => {
    renderOnPage(
      <>
        <DueWindow p10="2027-05-28" p50="2027-12-01" p90={null} today={today} bare />
        <DueWindow p10="2027-05-28" p50={null} p90={null} today={today} bare />
        <DueWindow p10={null} p50={null} p90={null} today={today} bare />
      </>,
    );
    const names = screen.getAllByRole('img').map((drawing) => drawing.getAttribute('aria-label'));
    expect(names).toEqual([
      'from 28 May 2027 on, most likely 1 December 2027',
      'from 28 May 2027 on',
      'not within the next two years',
    ]);
    for (const path of document.querySelectorAll('svg [d], svg [x], svg [cx]'))
      expect(path.outerHTML).not.toMatch(/NaN|undefined/);
  });
});
