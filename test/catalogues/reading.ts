import { readFileSync } from 'node:fs';
import {
  readCatalogue,
  type CatalogueReading,
  type GrainRow,
  type ReadOptions,
  type RejectRow,
} from '@/src/catalogues/read-catalogue';

export const knownMaterials: ReadonlyMap<string, string> = new Map([
  ['astrosil', 'astrosil'],
  ['astronomical silicate', 'astrosil'],
  ['carbon_be', 'carbon_be'],
  ['troilite', 'troilite'],
  ['water_ice', 'water_ice'],
  ['ice', 'water_ice'],
  ['organics', 'organics'],
]);

export type Read = CatalogueReading & { grains: GrainRow[]; rejects: RejectRow[] };

export async function* pieces(bytes: Uint8Array, size = 64 * 1024): AsyncGenerator<Uint8Array> {
  for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
}

export async function readBytes(
  bytes: Uint8Array,
  options: Partial<ReadOptions> = {},
  pieceSize?: number,
): Promise<Read> {
  const grains: GrainRow[] = [];
  const rejects: RejectRow[] = [];
  const reading = await readCatalogue(
    pieces(bytes, pieceSize),
    { knownMaterials, maxRows: 1e6, ...options },
    { grain: (row) => void grains.push(row), reject: (row) => void rejects.push(row) },
  );
  return { ...reading, grains, rejects };
}

export const readText = (text: string, options?: Partial<ReadOptions>, pieceSize?: number): Promise<Read> =>
  readBytes(new TextEncoder().encode(text), options, pieceSize);

export const fixtureBytes = (name: string): Uint8Array =>
  new Uint8Array(readFileSync(new URL(`../../fixtures/catalogues/${name}`, import.meta.url)));

export const readAwkward = (name: string, options?: Partial<ReadOptions>): Promise<Read> =>
  readBytes(fixtureBytes(`awkward/${name}`), options);
