// Ends the database server that this run started, if it did.
export default async function endDatabase() {
  await globalThis.stopTestDatabase?.();
}
