import { inTurn } from './in-turn';

it('hands each batch to one of those who ask at once', async () => {
  const ids = ['a', 'b', 'c', 'd', 'e'];
  const next = inTurn(async (after = '') => {
    await new Promise((resolve) => setTimeout(resolve, 1));
    return ids.filter((id) => id > after).slice(0, 2);
  });
  expect(await Promise.all([next(), next(), next(), next(), next()])).toEqual([
    ['a', 'b'],
    ['c', 'd'],
    ['e'],
    [],
    [],
  ]);
});
