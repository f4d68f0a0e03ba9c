import { isMainThread } from 'node:worker_threads';

const graceMs = Number(process.env.CHAFFLINE_GRACE_MS);

// What a child forks inherits this module but is not meant: it lives by the channel of its own parent.
const isOurChild = process.ppid === Number(process.env.CHAFFLINE_PARENT_PID);

// The channel closes also when the parent was killed and could tell nobody.
if (isMainThread && isOurChild && process.channel) {
  process.once('disconnect', () => {
    if (graceMs === 0) process.exit(1);
    setTimeout(() => process.exit(1), graceMs).unref();
    process.kill(process.pid, 'SIGTERM');
  });
  process.channel.unref();
}
