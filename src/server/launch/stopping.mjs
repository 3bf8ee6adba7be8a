/**
 * Calls `stop` once at Ctrl-C, at SIGTERM or SIGHUP, or when npm, having started us, is gone (it may be killed without a
 * word to us). A second Ctrl-C does not wait any longer.
 */
export function onStop(stop) {
  let asked = 0;
  const ask = (exitCode) => {
    asked += 1;
    if (asked === 1) stop(exitCode);
    else if (asked > 2) process.exit(exitCode);
  };
  process.on('SIGINT', () => ask(130));
  process.on('SIGTERM', () => ask(143));
  process.on('SIGHUP', () => ask(129));
  if (!process.env['npm_lifecycle_event']) return;
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    ask(143);
  }, 500);
  watch.unref();
}
