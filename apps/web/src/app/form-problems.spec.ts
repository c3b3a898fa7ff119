import { describe, expect, it, vi } from 'vitest';
import { ApiProblem } from './api-problem';
import { showProblems } from './form-problems';

const refusal = (...paths: string[]) =>
  new ApiProblem({
    type: 'about:blank',
    title: 'Check',
    status: 422,
    detail: 'Please check.',
    errors: paths.map((path) => ({ path, message: `wrong ${path}` })),
  });

describe('showProblems', () => {
  it('puts each complaint beside its field, the first in focus, and says nothing at the head', () => {
    const setError = vi.fn();
    expect(showProblems(refusal('day', 'notes'), ['day', 'notes'], setError)).toBeNull();
    expect(setError.mock.calls).toEqual([
      ['day', { message: 'wrong day' }, { shouldFocus: true }],
      ['notes', { message: 'wrong notes' }, { shouldFocus: false }],
    ]);
  });

  it('never swallows a complaint about something the form does not show', () => {
    const setError = vi.fn();
    expect(showProblems(refusal('day', 'chainId'), ['day'], setError)).toBe('wrong chainId');
    expect(setError).toHaveBeenCalledOnce();
  });

  it('gives the sentence of any other trouble', () => {
    expect(showProblems(refusal(), ['day'], vi.fn())).toBe('Please check.');
    expect(showProblems(new TypeError('x is undefined'), ['day'], vi.fn())).toMatch(/^Something went wrong/);
  });
});
