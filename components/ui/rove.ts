/** Arrow keys within a row of tabs or radios: the place to go to, or undefined when the key means nothing here. */
export function placeAfterKey(key: string, place: number, count: number): number | undefined {
  if (count === 0) return undefined;
  if (key === 'ArrowRight' || key === 'ArrowDown') return (place + 1) % count;
  if (key === 'ArrowLeft' || key === 'ArrowUp') return (place - 1 + count) % count;
  if (key === 'Home') return 0;
  if (key === 'End') return count - 1;
  return undefined;
}

/** Moves the focus to the item of that place within the group the event came from. */
export function focusPlace(group: Element, role: string, place: number): void {
  group.querySelectorAll<HTMLElement>(`[role="${role}"]`)[place]?.focus();
}
