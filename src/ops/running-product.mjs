import { say } from './say.mjs';
import { runningServerFile } from './server-file.mjs';
import { supervisorPid } from './product-record.mjs';
import { tryLock } from './exclusive.mjs';
import { pause } from './wait-until.mjs';

/** Reports the product that another command runs or is just starting; false when that one ends before it is ready. */
export async function sayWhereItRuns() {
  let told = false;
  for (;;) {
    const facts = runningServerFile();
    if (facts) {
      say(`Chaffline already runs at ${facts.url} (process ${facts.pid}). Stop it with: npm run stop`);
      return true;
    }
    const release = await tryLock('product');
    if (release) {
      await release();
      return false;
    }
    if (!told) say(`Chaffline is being started by process ${supervisorPid() ?? 'unknown'}: waiting for it`);
    told = true;
    await pause(250);
  }
}
