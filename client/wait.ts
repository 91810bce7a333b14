/** Waits grow by two from `first` to at most `most`, each cut to a random half to whole of itself. */
export interface Backoff {
  firstMilliseconds: number;
  mostMilliseconds: number;
}

export function backoffMilliseconds(
  attempt: number,
  { firstMilliseconds, mostMilliseconds }: Backoff,
): number {
  const whole = Math.min(mostMilliseconds, firstMilliseconds * 2 ** Math.min(attempt, 30));
  return whole * (0.5 + Math.random() / 2);
}

/** Pauses that `wake` ends early: a line that is back should not wait for the clock. */
export class Pause {
  private readonly ends = new Set<() => void>();

  wait(milliseconds: number): Promise<void> {
    return new Promise((resolve) => {
      const end = () => {
        clearTimeout(timer);
        this.ends.delete(end);
        resolve();
      };
      const timer = setTimeout(end, milliseconds);
      this.ends.add(end);
    });
  }

  wake(): void {
    for (const end of [...this.ends]) end();
  }
}
