import { accessSync, constants, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { Failure } from './failure.mjs';
import { installSystemPackage } from './system-package.mjs';

const needed = ['initdb', 'postgres', 'psql'];
const debianHome = '/usr/lib/postgresql';

function isProgram(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false; // absent and forbidden come to the same here
  }
}

function debianDirs() {
  try {
    const versions = readdirSync(debianHome).filter((name) => /^\d+$/.test(name));
    return versions.sort((a, b) => Number(b) - Number(a)).map((version) => join(debianHome, version, 'bin'));
  } catch (error) {
    if (error.code === 'ENOENT') return [];
    throw error;
  }
}

const complete = (dir) => needed.every((name) => isProgram(join(dir, name)));

export function findPostgresPrograms(searchPath = process.env.PATH ?? '') {
  return [...debianDirs(), ...searchPath.split(delimiter).filter(Boolean)].find(complete);
}

/** A folder of matching PostgreSQL programs, installed when there is none. */
export async function ensurePostgresPrograms() {
  const found = findPostgresPrograms();
  if (found) return found;
  await installSystemPackage('postgresql', 'PostgreSQL');
  const installed = findPostgresPrograms();
  if (!installed) throw new Failure(`PostgreSQL was installed, but ${needed.join(', ')} are not below ${debianHome}.`);
  return installed;
}
