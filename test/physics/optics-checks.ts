import { readFileSync } from 'node:fs';
import { expect } from 'vitest';
import { opticsFromLibraryEntry, type LibraryEntry, type Optics } from '@/src/physics/materials';

/** One published or independently computed value; it passes when the relative or the absolute tolerance holds. */
export interface Check {
  id: string;
  quantity: string;
  inputs: Record<string, unknown>;
  expected: number | Record<string, number>;
  tolerance: { rel?: number; abs?: number; relative?: number; absolute?: number };
  source: string;
}

interface StoredMaterial extends LibraryEntry {
  id: string;
  components: (LibraryEntry['components'][number] & { label: string })[];
}

const read = (path: string): unknown => JSON.parse(readFileSync(new URL(path, import.meta.url), 'utf8'));

const { checks } = read('./checks.json') as { checks: Check[] };

export const library = (read('../../fixtures/materials/materials.json') as { materials: StoredMaterial[] }).materials;

/** Checks whose id starts with one of the prefixes; none is an error, so that a test cannot pass by finding nothing. */
export function checksNamed(...prefixes: string[]): Check[] {
  const found = checks.filter(({ id }) => prefixes.some((prefix) => id.startsWith(prefix)));
  if (found.length === 0) throw new Error(`no check is named ${prefixes.join(', ')}`);
  return found;
}

export function titleOf({ id, quantity, source }: Check): string {
  return `${id}: ${quantity} [${source}]`;
}

/** Asserts a value against a check and returns its relative deviation. */
export function expectWithin(check: Check, actual: number, expected: number): number {
  const deviation = Math.abs(actual - expected);
  const { rel, abs, relative, absolute } = check.tolerance;
  const allowed = Math.max((rel ?? relative ?? 0) * Math.abs(expected), abs ?? absolute ?? 0);
  expect(deviation, `${titleOf(check)}: ${actual} instead of ${expected}`).toBeLessThanOrEqual(allowed);
  return expected === 0 ? deviation : deviation / Math.abs(expected);
}

export function expectedNumber(check: Check): number {
  if (typeof check.expected !== 'number') throw new Error(`${check.id} has no single expected value`);
  return check.expected;
}

export function numberOf(check: Check, name: string): number {
  const value = check.inputs[name];
  if (typeof value !== 'number') throw new Error(`${check.id} has no number ${name}`);
  return value;
}

export function indexOf(check: Check): [number, number] {
  const index = check.inputs.m;
  if (Array.isArray(index)) return [Number(index[0]), Number(index[1])];
  return [numberOf(check, 'n'), numberOf(check, 'k')];
}

export function libraryOptics(id: string): Optics {
  const entry = library.find((material) => material.id === id);
  if (entry === undefined) throw new Error(`the library has no ${id}`);
  return opticsFromLibraryEntry(entry);
}
