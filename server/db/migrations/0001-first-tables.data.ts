// prettier-ignore
export const firstTables: string[] = [];
