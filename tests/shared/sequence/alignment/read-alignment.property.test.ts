import fc from 'fast-check';
import { columnOfResidue, residueAtColumn } from '@/shared/sequence/alignment/columns';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import { columnIndex, residueIndex } from '@/shared/sequence/positions';

const residue = fc.constantFrom(...'ARNDCQEGHILKMFPSTWYVBZJXUOacdefghiklmnpqrstvwy');
const cell = fc.oneof({ weight: 3, arbitrary: residue }, fc.constantFrom('-', '.', '~'));
const alignments = fc
  .tuple(fc.integer({ min: 1, max: 6 }), fc.integer({ min: 2, max: 40 }))
  .chain(([rowCount, width]) =>
    fc.array(fc.tuple(residue, fc.array(cell, { minLength: width - 1, maxLength: width - 1 })), {
      minLength: rowCount,
      maxLength: rowCount,
    }),
  )
  .map((rows) => rows.map(([first, rest]) => first + rest.join('')));

test('what is written is read back, whatever the line width and line ends', () => {
  fc.assert(
    fc.property(
      alignments,
      fc.integer({ min: 1, max: 50 }),
      fc.constantFrom('\n', '\r\n', '\r'),
      (texts, lineWidth, lineEnd) => {
        // Enough of one plain protein letter that no file looks like DNA.
        const rows = texts.map((text) => `${text}WWWWWWWWWWWWW`);
        const lines = rows.flatMap((text, index) => [
          `>row${index} of ${rows.length}`,
          ...(text.match(new RegExp(`.{1,${lineWidth}}`, 'g')) ?? []),
        ]);
        const { value, issues } = readAlignment(new TextEncoder().encode(lines.join(lineEnd)));
        expect(issues.filter((issue) => issue.severity === 'error')).toEqual([]);
        expect(value?.rows.map((row) => row.text)).toEqual(rows);
        value?.rows.forEach((row) => {
          const placed = [...row.text].flatMap((_, column) => {
            const index = residueAtColumn(row, columnIndex(column));
            if (index === null) return [];
            expect(columnOfResidue(row, index)).toBe(column);
            return [row.residues[index]];
          });
          expect(placed.join('')).toBe(row.text.replace(/[-.~]/g, '').toUpperCase());
          expect(columnOfResidue(row, residueIndex(row.residues.length))).toBeNull();
        });
      },
    ),
    { numRuns: 200 },
  );
});

test('no bytes make the reader throw, and a null value always comes with an error', () => {
  const anything = fc.oneof(
    fc.uint8Array({ maxLength: 300 }),
    fc
      .array(
        fc.constantFrom('>', '>a', '\n', '\r', 'MKV', '-', '*', '?', ' ', '/1-3', '\u00df', '1', '#', '@'),
      )
      .map((parts) => new TextEncoder().encode(parts.join(''))),
  );
  fc.assert(
    fc.property(anything, (file) => {
      const { value, issues } = readAlignment(file);
      const failed = issues.some((issue) => issue.severity === 'error');
      expect(value === null).toBe(failed);
      for (const row of value?.rows ?? []) expect(row.text).toHaveLength(value?.columnCount ?? -1);
    }),
    { numRuns: 500 },
  );
});
