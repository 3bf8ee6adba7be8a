/** Runs one step, telling its name before and its time after. On standard error: standard output is for results. */
export async function step(name, work) {
  process.stderr.write(`- ${name}\n`);
  const start = Date.now();
  const result = await work();
  const seconds = (Date.now() - start) / 1000;
  if (seconds >= 1) process.stderr.write(`  done in ${seconds.toFixed(1)} s\n`);
  return result;
}

/** One line below a step. */
export function say(line) {
  process.stderr.write(`  ${line}\n`);
}
