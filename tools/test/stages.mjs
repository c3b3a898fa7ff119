import { build, check, jest, playwright, vitest } from './runners.mjs';

/** What `npm test` runs, in this order; `group` is what `--only` chooses; `alongside` goes with the one before. */
const stages = [
  { name: 'format', group: 'checks', work: check('format:check') },
  { name: 'lint', group: 'checks', work: check('lint'), alongside: true },
  { name: 'types', group: 'checks', work: check('typecheck') },
  { name: 'build', group: 'checks', work: build, alongside: true },
  { name: 'unit', group: 'unit', work: jest('spec'), needs: ['database'] },
  { name: 'api', group: 'api', work: jest('e2e-spec'), needs: ['database'] },
  { name: 'web', group: 'web', work: vitest },
  { name: 'browser', group: 'browser', work: playwright, needs: ['build', 'browser'] },
];

export const groups = [...new Set(stages.map(({ group }) => group))];

/** The stages to run, and the build too where one of them needs it. */
export function chosenStages(only) {
  if (!only) return stages;
  const chosen = stages.filter(({ group }) => group === only);
  const needed = chosen.flatMap(({ needs = [] }) => needs);
  return stages.filter((stage) => chosen.includes(stage) || needed.includes(stage.name));
}
