/** A set of listeners; one that throws never stops the others. */
export class Emitter<Args extends unknown[]> {
  private readonly listeners = new Set<(...args: Args) => void>();

  readonly subscribe = (listener: (...args: Args) => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  emit(...args: Args): void {
    for (const listener of [...this.listeners]) {
      try {
        listener(...args);
      } catch (error) {
        console.error(error);
      }
    }
  }
}
