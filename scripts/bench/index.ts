import { besideMpmath } from './beside-mpmath';
import { tenTriprotic } from './ten-triprotic';
import { triproticCurve } from './triprotic-curve';

/** Benches, each a file: it checks its outputs, then gives timings and ratios of one run. */
const benches = [triproticCurve, besideMpmath, tenTriprotic];
const rounds = 5;

const results = benches.map((bench) => bench(rounds));
const line = (name: string, value: string) => `  ${name.padEnd(52)}${value.padStart(12)}`;

if (process.argv.includes('--json')) {
  console.log(JSON.stringify({ node: process.version, rounds, benches: results }, null, 2));
} else {
  for (const { title, timings, ratios } of results) {
    console.log(`${title} (medians of ${rounds} interleaved rounds)`);
    for (const { name, milliseconds } of timings) {
      console.log(line(name, `${milliseconds.toFixed(milliseconds < 10 ? 2 : 1)} ms`));
    }
    for (const { name, ratio } of ratios)
      console.log(line(name, `${ratio.toFixed(ratio < 10 ? 2 : 0)} x`));
  }
}
