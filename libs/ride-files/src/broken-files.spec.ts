import fc from 'fast-check';
import { okCases } from '../fixtures/ok-cases';
import { readWholeRideFile } from './index';

const outcomes = ['ride', 'other-sport', 'not-a-ride', 'unreadable'];

/** Every file is read to an end with a sentence, whatever happened to its bytes. */
async function expectSentences(file: string, bytes: Uint8Array): Promise<void> {
  for (const result of await readWholeRideFile(file, bytes)) {
    expect(outcomes).toContain(result.outcome);
    expect(result.message).toMatch(/^[A-Z“\d][^]*[.?]$/);
    if (result.outcome === 'ride') expect(result.ride?.distanceM).toBeGreaterThanOrEqual(0);
  }
}

describe.each(okCases)('$file', ({ file, bytes }) => {
  it('is read to an end wherever it breaks off', async () => {
    await fc.assert(
      fc.asyncProperty(fc.integer({ min: 0, max: bytes.length }), (length) =>
        expectSentences(file, bytes.slice(0, length)),
      ),
      { numRuns: 25 },
    );
  });

  it('is read to an end whatever bytes are spoilt', async () => {
    const spoiling = fc.array(fc.tuple(fc.nat(bytes.length - 1), fc.nat(255)), {
      minLength: 1,
      maxLength: 20,
    });
    await fc.assert(
      fc.asyncProperty(spoiling, (spoilt) => {
        const copy = bytes.slice();
        for (const [at, value] of spoilt) copy[at] = value;
        return expectSentences(file, copy);
      }),
      { numRuns: 25 },
    );
  });
});
