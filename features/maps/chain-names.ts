/** Whether the second of two one-letter chain ids follows the first: B after A, b after a, 2 after 1. */
function follows(one: string, other: string): boolean {
  const sameKind = [/^[A-Z]$/, /^[a-z]$/, /^[0-9]$/].some((kind) => kind.test(one) && kind.test(other));
  return sameKind && other.charCodeAt(0) === one.charCodeAt(0) + 1;
}

/** Chains as they are said: `A to I`, `A, B`, `K to N, P to U`. A run counts from three on; the order is kept. */
export function chainNames(ids: readonly string[]): string {
  const runs: string[][] = [];
  for (const id of ids) {
    const open = runs.at(-1);
    const last = open?.at(-1);
    if (open && last !== undefined && follows(last, id)) open.push(id);
    else runs.push([id]);
  }
  return runs.map((run) => (run.length < 3 ? run.join(', ') : `${run[0]} to ${run.at(-1)}`)).join(', ');
}
