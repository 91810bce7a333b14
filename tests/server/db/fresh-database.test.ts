import mysql from 'mysql2/promise';
import { createFreshDatabase } from '../../support/fresh-database';

test('a fresh database is empty, of its own, and keeps every letter', async () => {
  const [first, second] = await Promise.all([createFreshDatabase(), createFreshDatabase()]);
  expect(first.url).not.toBe(second.url);
  const connection = await mysql.createConnection({ uri: first.url });
  const [tables] = await connection.query('SHOW TABLES');
  expect(tables).toEqual([]);
  await connection.query('CREATE TABLE note (body VARCHAR(20))');
  await connection.query('INSERT INTO note VALUES (?)', ['βK162 ≠ bK162 🧬']);
  const [rows] = await connection.query('SELECT body FROM note');
  expect(rows).toEqual([{ body: 'βK162 ≠ bK162 🧬' }]);
  await connection.end();
  await Promise.all([first.drop(), second.drop()]);
});
