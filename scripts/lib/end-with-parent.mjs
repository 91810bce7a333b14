// Ends this process when its parent is gone. The server loads it, so that killing the start script outright
// frees the port; the scripts load it under npm.
import { isMainThread } from 'node:worker_threads';

if (isMainThread) {
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    process.kill(process.pid, 'SIGTERM');
  }, 500);
  watch.unref();
}
