interface Versioned {
  version: number;
}

/** The one with the higher version; the old one itself when they are equal, so that nothing is drawn again. */
export function keepNewer<Value extends Versioned>(old: Value | undefined, next: Value): Value {
  return old && old.version >= next.version ? old : next;
}

/**
 * The later one unless its version is lower. For what carries counts of other things, which change without a version
 * of its own: the last event has the last count.
 */
export function keepNotOlder<Value extends Versioned>(old: Value, next: Value): Value {
  return old.version > next.version ? old : next;
}

/**
 * Puts a whole object into a list by its id, keeping the higher version, and keeps the list's order. The list itself
 * when nothing changed.
 */
export function putNewer<Value extends Versioned & { id: string }>(
  list: Value[],
  next: Value,
  inOrder: (one: Value, other: Value) => number,
  keep: (old: Value, next: Value) => Value = keepNewer,
): Value[] {
  return putBy(list, next, (item) => item.id === next.id, inOrder, keep);
}

/** The same for things known by something other than an id and a version. */
export function putBy<Value>(
  list: Value[],
  next: Value,
  isSame: (item: Value) => boolean,
  inOrder: (one: Value, other: Value) => number,
  keep: (old: Value, next: Value) => Value,
): Value[] {
  const at = list.findIndex(isSame);
  const old = list[at];
  if (old === undefined) return [...list, next].sort(inOrder);
  const kept = keep(old, next);
  if (kept === old) return list;
  return list.map((item, index) => (index === at ? kept : item)).sort(inOrder);
}

/** Text order by code, as ids made later sort later. */
export const byText = (one: string, other: string): number => (one < other ? -1 : one > other ? 1 : 0);

/** For lists with the newest first. */
export const newestFirst = (one: { id: string }, other: { id: string }): number => byText(other.id, one.id);
