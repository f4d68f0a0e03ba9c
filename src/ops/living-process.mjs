import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

const gone = (error) => ['ENOENT', 'ESRCH', 'EACCES', 'EPERM'].includes(error.code);

function readProc(pid, name) {
  try {
    return readFileSync(`/proc/${pid}/${name}`, 'utf8');
  } catch (error) {
    if (gone(error)) return undefined;
    throw error;
  }
}

/** The numbered fields of proc(5) from the third on; the second, a name, may hold anything. */
function statFields(pid) {
  const stat = readProc(pid, 'stat');
  return stat?.slice(stat.lastIndexOf(')') + 2).split(' ');
}

/** Pid and start time together name one process for ever, while a pid alone is used again; undefined when it has ended. */
export function processStamp(pid) {
  const fields = statFields(pid);
  if (!fields) return undefined;
  const [state, startTime] = [fields[0], fields[19]];
  return state === 'Z' || state === 'X' ? undefined : `${pid}@${startTime}`;
}

export const isAlive = (pid) => processStamp(pid) !== undefined;

export const isSameProcess = (stamp) => processStamp(Number.parseInt(stamp, 10)) === stamp;

export const parentPid = (pid) => Number(statFields(pid)?.[1] ?? 0);

export function commandLine(pid) {
  return readProc(pid, 'cmdline')?.split('\0').filter(Boolean) ?? [];
}

export function workingDir(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch (error) {
    if (gone(error)) return undefined;
    throw error;
  }
}

export function processesWorkingIn(dir) {
  const pids = readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number);
  return pids.filter((pid) => workingDir(pid) === dir && isAlive(pid));
}
