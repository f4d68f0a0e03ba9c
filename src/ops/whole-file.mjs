import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/** Readers see the old content or the new one, never a half. */
export function writeWhole(path, content, mode = 0o644) {
  mkdirSync(dirname(path), { recursive: true });
  const half = `${path}.${process.pid}.part`;
  try {
    writeFileSync(half, content, { mode });
    renameSync(half, path);
  } catch (error) {
    rmSync(half, { force: true });
    throw error;
  }
}

export function readIfThere(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT' || error.code === 'ENOTDIR') return undefined;
    throw error;
  }
}

export function readJsonIfThere(path) {
  const text = readIfThere(path);
  return text === undefined ? undefined : JSON.parse(text);
}
