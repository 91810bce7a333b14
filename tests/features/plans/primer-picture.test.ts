import type { Design } from '@/shared/contracts/plans';
import { complement } from '@/shared/sequence/construct/bases';
import { inTriplets, primerPicture } from '@/features/plans/primer-picture';
import { buildProtein, worked, workedConstruct } from './support';

const protein = buildProtein(worked.protein);

function designOf(start: number, forward: string, reverse: string, codonStart: number, codonTo: string) {
  const primer = { start, length: forward.length };
  return {
    primers: [
      { ...primer, name: 'F', bases: forward, strand: '+' },
      { ...primer, name: 'R', bases: reverse, strand: '-' },
    ],
    codons: [{ codonStart, codonTo }],
  } as unknown as Pick<Design, 'primers' | 'codons'>;
}

test.each(worked.cases.filter(({ complementaryPair }) => complementaryPair))(
  'the pair of $short lies where Biopython placed it, with as many mismatches',
  ({ complementaryPair, codonStart0InConstruct, newCodon, oldCodon, codonNumber }) => {
    const { forward, reverse, start0, mismatches } = complementaryPair!;
    const design = designOf(start0, forward, reverse, codonStart0InConstruct, newCodon);
    const picture = primerPicture(workedConstruct, protein, design);
    if (!picture) throw new Error('nothing drawn');
    const [one, other] = picture.primers;
    expect(picture.firstBase + (one?.column ?? 0)).toBe(start0);
    expect(one?.letters).toBe(forward);
    expect(other?.letters).toBe([...reverse].reverse().join(''));
    for (const primer of picture.primers)
      expect(primer.pairs.filter((pair) => !pair)).toHaveLength(mismatches);
    const changed = picture.codons.filter(({ codonTo }) => codonTo !== null);
    expect(changed).toHaveLength(1);
    expect(changed[0]).toMatchObject({ bases: oldCodon, codonTo: newCodon, label: String(codonNumber) });
    const inPrimer = (changed[0]?.column ?? 0) - (one?.column ?? 0);
    expect(forward.slice(inPrimer, inPrimer + 3)).toBe(newCodon);
  },
);

test('the strands are partners, letter by letter', () => {
  const picture = primerPicture(
    workedConstruct,
    protein,
    designOf(217, 'A'.repeat(33), 'T'.repeat(33), 232, 'AAC'),
  );
  expect(picture?.bottom).toBe(complement(picture?.top ?? ''));
  expect(picture?.top).toHaveLength(33 + 18);
});

test('a pair across the origin of a circle is drawn in one piece', () => {
  const { bases } = workedConstruct;
  const around = bases.slice(-10) + bases.slice(0, 15);
  const design = designOf(bases.length - 10, around, around, 52, 'CAG');
  const picture = primerPicture(workedConstruct, protein, design);
  expect(picture?.firstBase).toBe(bases.length - 19);
  expect(picture?.primers[0]?.pairs.every(Boolean)).toBe(true);
});

test('a linear construct ends where it ends', () => {
  const { bases } = workedConstruct;
  const design = designOf(4, bases.slice(4, 34), bases.slice(4, 34), 52, 'CAG');
  const picture = primerPicture({ ...workedConstruct, circular: false }, protein, design);
  expect(picture?.firstBase).toBe(0);
  expect(picture?.primers[0]?.column).toBe(4);
  expect(picture?.primers[0]?.pairs.every(Boolean)).toBe(true);
});

test('primers of another construct are not drawn', () => {
  expect(primerPicture(workedConstruct, protein, designOf(5000, 'ACGT', 'ACGT', 52, 'CAG'))).toBeNull();
});

test('bases are written in threes', () => {
  expect(inTriplets('CAGGCACTGA')).toBe('CAG GCA CTG A');
  expect(inTriplets('CAGGCA')).toBe('CAG GCA');
});
