import { v7 } from 'uuid';

/** Sorts by time of making, which keeps inserts at the end of each index. */
export const newId = (): string => v7();
