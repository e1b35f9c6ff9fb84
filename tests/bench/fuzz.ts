/** 100,000 readings of any shape through the contract and the fit. Run: npx tsx tests/bench/fuzz.ts [count] [seed] */
import { fuzzReadings } from '../lib/measure/fuzz-trials';

const [count = '100000', seed = '20261201'] = process.argv.slice(2);
const began = performance.now();
const { threw, notNumbers, silent, ...counts } = fuzzReadings(Number(count), Number(seed));
console.table([
  {
    ...counts,
    threw: threw.length,
    'not a number': notNumbers.length,
    silent: silent.length,
    s: ((performance.now() - began) / 1000).toFixed(0),
  },
]);
for (const bad of [...threw, ...notNumbers, ...silent].slice(0, 10)) console.log(bad);
