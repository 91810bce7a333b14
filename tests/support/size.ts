/** `npm test` runs the small size, `npm run faults` the full one. */
export const isFull = process.env.TEST_SIZE === 'full';

export const pause = (milliseconds: number) => new Promise<void>((done) => setTimeout(done, milliseconds));

/** Waits until it holds; gives how long that took, in milliseconds. */
export async function until(
  what: string,
  holds: () => boolean | Promise<boolean>,
  withinMilliseconds: number,
): Promise<number> {
  const began = Date.now();
  while (!(await holds())) {
    if (Date.now() - began > withinMilliseconds)
      throw new Error(`Not within ${withinMilliseconds} ms: ${what}`);
    await pause(20);
  }
  return Date.now() - began;
}

/** What was measured, where whoever runs the tests sees it. */
export function report(line: string): void {
  process.stderr.write(`    ${line}\n`);
}
