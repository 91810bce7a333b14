export const migrations: never[] = [];
