import { commandLine, parentPid, processStamp } from './living-process.mjs';

const isNpm = (pid) => {
  const [program = '', script = ''] = commandLine(pid);
  return program === 'npm' || program.startsWith('npm ') || script.endsWith('npm-cli.js');
};

/** The processes between us and the npm that started us, with it; none when we were started directly. */
export function npmAncestors() {
  const chain = [];
  for (let pid = process.ppid; pid > 1 && chain.length < 4; pid = parentPid(pid)) {
    chain.push(processStamp(pid));
    if (isNpm(pid)) return chain;
  }
  return [];
}
