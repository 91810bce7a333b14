import { v7 } from 'uuid';

/** A UUID whose text sorts by time. Works on plain http too, where `crypto.randomUUID` is missing. */
export const newId = (): string => v7();
