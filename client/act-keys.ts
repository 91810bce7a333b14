import { newId } from './new-id';
import { ApiProblem } from './problem';

/**
 * Keys of acts of one form. The same thing sent again while nobody knows whether it was done goes under the same key,
 * so it is done once; anything else, and everything after an answer, gets a new one.
 */
export class ActKeys {
  private pending: { what: string; key: string } | null = null;

  keyFor(what: unknown): string {
    const text = JSON.stringify(what);
    if (this.pending?.what !== text) this.pending = { what: text, key: newId() };
    return this.pending.key;
  }

  answered(error?: unknown): void {
    if (!(error instanceof ApiProblem) || !error.undecided) this.pending = null;
  }
}
