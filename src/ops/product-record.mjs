import { rmSync } from 'node:fs';
import { inLocal } from './places.mjs';
import { isSameProcess, processStamp } from './living-process.mjs';
import { readJsonIfThere, writeWhole } from './whole-file.mjs';
import { waitUntil } from './wait-until.mjs';

const recordFile = inLocal('product.json');

/** Which processes the product consists of, kept from its first moment on, so that a killed one can be cleared away. */
export function recordProduct(childPids) {
  const children = childPids.map(processStamp).filter(Boolean);
  writeWhole(recordFile, `${JSON.stringify({ supervisor: processStamp(process.pid), children })}\n`);
}

export const forgetProduct = () => rmSync(recordFile, { force: true });

/** The process id of the living supervisor. */
export function supervisorPid() {
  const stamp = readJsonIfThere(recordFile)?.supervisor;
  return stamp && isSameProcess(stamp) ? Number.parseInt(stamp, 10) : undefined;
}

function signalGroups(stamps, signal) {
  for (const stamp of stamps) if (isSameProcess(stamp)) process.kill(-Number.parseInt(stamp, 10), signal);
}

/** Ends what a killed supervisor left behind; answers how many processes that were. */
export async function endLeftovers() {
  const left = (readJsonIfThere(recordFile)?.children ?? []).filter(isSameProcess);
  if (left.length === 0) return 0;
  signalGroups(left, 'SIGTERM');
  await waitUntil(() => !left.some(isSameProcess), { withinMs: 5_000 });
  signalGroups(left, 'SIGKILL');
  await waitUntil(() => !left.some(isSameProcess), { withinMs: 5_000 });
  return left.length;
}
