import { compare } from './compare';
import { generateChain } from './generate-chain';

const CHAINS = 200;
const ALLOWED = 0.01;

/** `npm run reference [chains]`: the elongation posterior against brute-force summation, chain by chain. */
function main(): void {
  const count = Number(process.argv[2] ?? CHAINS);
  const results = Array.from({ length: count }, (_, seed) => ({ seed, ...compare(generateChain(seed)) }));
  const sorted = [...results].sort((a, b) => a.worst - b.worst);
  const at = (p: number) => sorted[Math.min(Math.floor(p * count), count - 1)]!;
  const percent = (share: number) => `${(100 * share).toFixed(2)} %`;
  console.log(`${count} generated chains; differences as a share of the P10-P90 width`);
  console.log(
    `median ${percent(at(0.5).worst)}, P90 ${percent(at(0.9).worst)}, worst ${percent(at(1).worst)}`,
  );
  const past = Math.max(...results.map(({ chancePast }) => chancePast));
  console.log(`chance of being past the limit: differs by ${past.toFixed(4)} at most`);
  const inGaps = results.reduce((sum, result) => sum + result.inGaps, 0);
  console.log(
    `${inGaps} of ${9 * count} levels in an empty gap between two explanations: equal chance there instead`,
  );
  const mean = (of: 'product' | 'reference') =>
    results.reduce((sum, { milliseconds }) => sum + milliseconds[of], 0) / count;
  console.log(
    `mean ms a chain: product ${mean('product').toFixed(2)}, reference ${mean('reference').toFixed(0)}`,
  );
  const apart = results.filter(({ worst }) => worst > ALLOWED);
  for (const { seed, worst, at: where } of apart) console.log(`chain ${seed}: ${percent(worst)} at ${where}`);
  process.exitCode = apart.length > 0 ? 1 : 0;
}

main();
