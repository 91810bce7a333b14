import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { readExcerpt } from '@/server/storage/excerpt';

describe('the text of a file around a place', () => {
  let folder: string;
  beforeAll(async () => {
    folder = await mkdtemp(path.join(tmpdir(), 'excerpt-'));
  });
  afterAll(() => rm(folder, { recursive: true }));

  const write = async (text: string) => {
    const file = path.join(folder, 'file');
    await writeFile(file, text);
    return file;
  };

  it('is the line and three on each side, whatever ends the lines', async () => {
    const file = await write('1\n2\r\n3\r4\n5\n6\n7\n8\n9');
    expect(await readExcerpt(file, 5)).toEqual({
      firstLine: 2,
      firstColumn: 1,
      lines: ['2', '3', '4', '5', '6', '7', '8'],
    });
  });

  it('moves along long lines until the column stands in it', async () => {
    const marked = `${'A'.repeat(400)}?${'C'.repeat(200)}`;
    const { firstColumn, lines } = await readExcerpt(await write(`>row\n${marked}\n`), 2, { column: 401 });
    expect(firstColumn).toBe(301);
    expect(lines[0]).toBe('');
    expect(lines[1]?.[401 - firstColumn]).toBe('?');
    expect(lines[1]).toHaveLength(201);
    expect(lines[1]?.endsWith('…')).toBe(true);
  });

  it('counts characters where one takes several bytes', async () => {
    const file = await write(`${'α'.repeat(400)}J${'γ'.repeat(300)}\n`);
    const { firstColumn, lines } = await readExcerpt(file, 1, { column: 401 });
    expect([...(lines[0] ?? '')][401 - firstColumn]).toBe('J');
  });

  it('begins at the first column while the place is near it', async () => {
    const { firstColumn, lines } = await readExcerpt(await write(`${'A'.repeat(300)}\n`), 1, { column: 150 });
    expect(firstColumn).toBe(1);
    expect(lines[0]).toBe(`${'A'.repeat(200)}…`);
  });
});
