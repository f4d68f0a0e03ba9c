import { readFileSync } from 'node:fs';
import { readCatalogue } from '@/src/catalogues/read-catalogue';
import type { Line } from './bench';
import { median } from './timing';

const copies = 10;
const rounds = 3;

/** Reading and checking a catalogue beside decoding its bytes and finding its line ends. */
export async function benchReading(): Promise<Line[]> {
  const [comment, header, ...rows] = readFileSync('fixtures/catalogues/collisional-population.csv', 'utf8')
    .trimEnd()
    .split('\n');
  const text = [comment, header, ...Array.from({ length: copies }, () => rows).flat()].join('\n');
  const bytes = Buffer.from(text);
  const knownMaterials = new Map(['astrosil', 'carbon_be'].map((slug) => [slug, slug]));
  const pairs: [number, number][] = [];
  let accepted = 0;
  for (let round = 0; round < rounds; round += 1) {
    const started = performance.now();
    const reading = await readCatalogue(
      pieces(bytes),
      { knownMaterials, maxRows: 1e7 },
      { grain: () => undefined, reject: () => undefined },
    );
    const between = performance.now();
    const lines = bytes.toString('utf8').split('\n').length;
    pairs.push([between - started, performance.now() - between]);
    accepted = reading.accepted;
    if (lines < accepted) throw new Error('fewer lines than grains');
  }
  return [
    {
      what: `reading and checking ${accepted.toLocaleString('en-US')} rows`,
      value: accepted / (median(pairs.map(([work]) => work)) / 1000),
      unit: 'rows/s',
      floor: 'decoding and splitting lines (time)',
      ratio: median(pairs.map(([work, floor]) => work / floor)),
    },
  ];
}

async function* pieces(bytes: Uint8Array): AsyncGenerator<Uint8Array> {
  for (let at = 0; at < bytes.length; at += 1 << 20) yield bytes.subarray(at, at + (1 << 20));
}
