import { mkdirSync, writeFileSync } from 'node:fs';
import { shortText } from './timing';
import { benchCopy } from './copy';
import { benchCurves } from './curves';
import { benchGrains } from './grains';
import { benchMie } from './mie';
import { benchReading } from './reading';

export type Line = { what: string; value: number; unit: string; floor: string; ratio: number };

/** npm run bench: each figure beside a floor measured in the same run; ratios, because machines differ. */
const lines: Line[] = [
  ...benchMie(),
  ...benchCurves(),
  ...benchGrains(),
  ...(await benchReading()),
  ...(await benchCopy()),
];

console.log(`\n${'what'.padEnd(58)}${'value'.padStart(12)} ${'unit'.padEnd(12)}${'ratio'.padStart(8)}  to`);
for (const { what, value, unit, ratio, floor } of lines) {
  console.log(
    `${what.padEnd(58)}${shortText(value).padStart(12)} ${unit.padEnd(12)}${ratio.toFixed(2).padStart(8)}  ${floor}`,
  );
}
mkdirSync('.local', { recursive: true });
writeFileSync(
  '.local/bench.json',
  `${JSON.stringify({ at: new Date().toISOString(), node: process.version, lines }, null, 2)}\n`,
);
console.log('\nAlso in .local/bench.json');
