import { readAlignedFasta } from '@/shared/sequence/alignment/read-fasta';
import { makeAlignments } from '@/shared/scenario/families';
import { offsetNumberings } from '@/shared/scenario/numberings.data';
import { alike } from '@/shared/scenario/substitutions.data';
import { demoSeed } from '@/shared/scenario/scenario';
import blosum62 from '@/tests/fixtures/blosum62.json';
import landmarkFile from '@/tests/fixtures/landmarks.json';

const alignments = makeAlignments(demoSeed);
const otherSeeds = [1, 2, 3, 11, 12, 2026];

describe('the files', () => {
  it.each(alignments.map((alignment) => [alignment.family, alignment] as const))(
    'hold the true alignment of %s, read back without an issue',
    (_, alignment) => {
      const { value, issues } = readAlignedFasta(alignment.text);
      expect(issues).toEqual([]);
      expect(value?.columnCount).toBe(alignment.columnCount);
      expect(value?.rows.map(({ name, residues }) => ({ name, residues }))).toEqual(
        alignment.rows.map(({ name, residues }) => ({ name, residues })),
      );
      alignment.rows.forEach((row, place) => {
        const columns = value?.rows[place]?.segments.flatMap((segment) =>
          Array.from({ length: segment.length }, (__, step) => segment.columnStart + step),
        );
        expect(columns).toEqual(row.columns);
      });
    },
  );

  it('have no column without a residue and no residue outside the twenty', () => {
    for (const { rows, columnCount } of alignments) {
      const taken = new Set(rows.flatMap((row) => row.columns));
      expect(taken.size).toBe(columnCount);
      for (const row of rows) expect(row.residues).toMatch(/^M[ARNDCQEGHILKMFPSTWYV]+$/);
    }
  });

  it('name every row by its organism and call it invented', () => {
    for (const { rows } of alignments) {
      expect(rows.length).toBeGreaterThanOrEqual(8);
      for (const row of rows) {
        expect(row.name).toBe(row.organism.replace(' ', '_'));
        expect(row.description).toContain('invented');
      }
    }
  });
});

describe('the invented proteins', () => {
  // Lengths of real subunits, from memory: c 72–90, a 226–271, β 459–482, γ 272–298.
  it.each([
    ['c', 76, 90],
    ['a', 230, 270],
    ['β', 455, 480],
    ['γ', 268, 292],
  ])('of %s are as long as real ones', (family, shortest, longest) => {
    const rows = alignments.find((alignment) => alignment.family === family)?.rows ?? [];
    for (const row of rows) {
      expect(row.residues.length).toBeGreaterThanOrEqual(shortest);
      expect(row.residues.length).toBeLessThanOrEqual(longest);
    }
  });

  it('differ in length within a family, by insertions and deletions', () => {
    for (const { rows } of alignments) {
      expect(new Set(rows.map((row) => row.residues.length)).size).toBeGreaterThan(3);
    }
  });

  it('are related, yet below 95 % identity, so that no chain fits two of them', () => {
    for (const { rows } of alignments) {
      rows.forEach((first, place) => {
        for (const second of rows.slice(place + 1)) {
          const both = [...first.text].flatMap((letter, column) => {
            const other = second.text.charAt(column);
            return letter === '-' || other === '-' ? [] : [letter === other];
          });
          const identity = both.filter(Boolean).length / both.length;
          expect(identity).toBeGreaterThan(0.35);
          expect(identity).toBeLessThan(0.95);
        }
      });
    }
  });

  // Real c subunits: exactly one R-[NQ]-P, the carboxylate 20 residues after its R, an acid alone in the middle of helix 2.
  it('of c have one loop motif, with the carboxylate 20 residues after it', () => {
    for (const seed of [demoSeed, ...otherSeeds]) {
      const c = makeAlignments(seed).find((alignment) => alignment.family === 'c');
      const letters = c?.rows.map((row) => {
        const motifs = [...row.residues.matchAll(/R[NQ]P/g)];
        expect(motifs).toHaveLength(1);
        const loop = motifs[0]?.index ?? -1;
        expect(row.columns[loop + 20]).toBe(c.sites.carboxylate);
        expect(
          row.residues.slice(loop + 10, loop + 20) + row.residues.slice(loop + 21, loop + 31),
        ).not.toMatch(/[DE]/);
        expect(row.residues.slice(0, loop)).toMatch(/[GA].[GA].[GA].[GA]/);
        return row.residues.charAt(loop + 20);
      });
      expect(letters?.sort().join('')).toBe('DDEEEEEEEQ');
    }
  });

  // Kyte & Doolittle 1982 JMB 157:105; window 19, a membrane helix at a mean of 1.6 or more.
  it('of c have two hydrophobic stretches, of a six, the fifth split by its arginine in some', () => {
    const stretches = (family: string) =>
      alignments
        .find((alignment) => alignment.family === family)
        ?.rows.map((row) => hydrophobicStretches(row.residues)) ?? [];
    for (const count of stretches('c')) expect(count).toBe(2);
    for (const count of stretches('a')) expect([6, 7]).toContain(count);
  });

  it('of β have one P-loop, of a one essential arginine, in one column', () => {
    const beta = alignments.find((alignment) => alignment.family === 'β');
    for (const row of beta?.rows ?? []) {
      const loops = [...row.residues.matchAll(/[AG].{4}GK[ST]/g)];
      expect(loops).toHaveLength(1);
      expect(row.columns[(loops[0]?.index ?? -1) + 6]).toBe(beta?.sites['P-loop lysine']);
      expect(row.residues).toMatch(/P[SAP][LIV][DNH].{3}S.S/);
    }
    const a = alignments.find((alignment) => alignment.family === 'a');
    const column = a?.sites['essential arginine'] ?? -1;
    expect(a?.rows.map((row) => row.text.charAt(column)).join('')).toBe('RRRRRRRRRR');
  });
});

it('substitutes by pairs that BLOSUM62 does not count against', () => {
  const rows: Record<string, number[]> = blosum62.rows;
  for (const [from, others] of Object.entries(alike)) {
    for (const to of others) expect(rows[from]?.[blosum62.order.indexOf(to)]).toBeGreaterThanOrEqual(0);
  }
});

describe('no invented protein carries the letter and number of a real landmark in its family', () => {
  const landmarks = knownLandmarks();

  it('knows the landmarks of each family', () => {
    expect(landmarks.get('c')).toContain('D61');
    expect(landmarks.get('a')).toContain('R210');
    expect(landmarks.get('a')).toContain('E223');
    expect(landmarks.get('β')).toContain('K155');
    expect(landmarks.get('γ')).toContain('C87');
  });

  it.each([demoSeed, ...otherSeeds])('with seed %d', (seed) => {
    for (const { family, rows } of makeAlignments(seed)) {
      for (const row of rows) {
        const offsets = offsetNumberings
          .filter((numbering) => numbering.family === family && numbering.organism === row.organism)
          .map((numbering) => numbering.offset);
        for (const offset of [0, ...offsets]) {
          const labels = [...row.residues].map((letter, index) => `${letter}${index + 1 + offset}`);
          expect(labels.filter((label) => landmarks.get(family)?.has(label))).toEqual([]);
        }
      }
    }
  });
});

/** Letter and number by family; rows of the fixture that list several organisms give one of each. */
function knownLandmarks(): Map<string, Set<string>> {
  const byFamily = new Map<string, Set<string>>();
  const names: Record<string, string> = { beta: 'β', gamma: 'γ', alpha: 'α' };
  for (const { family, aminoAcid, label } of landmarkFile.landmarks) {
    const name = names[family] ?? (family.startsWith('c') ? 'c' : family);
    const labels = byFamily.get(name) ?? new Set<string>();
    for (const part of String(label).split(' | ')) {
      labels.add(/^[A-Z]/.test(part) ? part : `${aminoAcid}${part}`);
    }
    byFamily.set(name, labels);
  }
  return byFamily;
}

const hydropathy: Record<string, number> = {
  I: 4.5,
  V: 4.2,
  L: 3.8,
  F: 2.8,
  C: 2.5,
  M: 1.9,
  A: 1.8,
  G: -0.4,
  T: -0.7,
  S: -0.8,
  W: -0.9,
  Y: -1.3,
  P: -1.6,
  H: -3.2,
  E: -3.5,
  Q: -3.5,
  D: -3.5,
  N: -3.5,
  K: -3.9,
  R: -4.5,
};

/** Runs of window centres at 1.6 or more; runs up to 4 apart are one, as an acid or a glycine splits them. */
function hydrophobicStretches(residues: string): number {
  const half = 9;
  const centres: number[] = [];
  for (let centre = half; centre < residues.length - half; centre += 1) {
    const window = [...residues.slice(centre - half, centre + half + 1)];
    const mean = window.reduce((sum, letter) => sum + (hydropathy[letter] ?? 0), 0) / window.length;
    if (mean >= 1.6) centres.push(centre);
  }
  return centres.filter((centre, place) => centre - (centres[place - 1] ?? -10) > 5).length;
}
