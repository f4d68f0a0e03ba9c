import { writeFileSync } from 'node:fs';
import { pause } from './wait-until.mjs';

/**
 * Where the kernel shares the processor between sessions first ("autogroup"), niceness counts only inside a session:
 * then the session itself has to step back too. Ordinary users may change that ten times a second at most.
 */
export async function lowerSessionPriority(pid, niceness) {
  for (let attempt = 0; attempt < 20; attempt += 1) {
    try {
      writeFileSync(`/proc/${pid}/autogroup`, String(niceness));
      return;
    } catch (error) {
      if (error.code !== 'EAGAIN') return; // a kernel without autogroups, or the process has ended already
    }
    await pause(110);
  }
}
