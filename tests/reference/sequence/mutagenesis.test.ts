import { complement } from '@/shared/sequence/construct/bases';
import { readCoding, type Coding } from '@/shared/sequence/construct/coding';
import { checkMutant } from '@/shared/sequence/construct/mutation-check';
import { sequenceNumbering } from '@/shared/sequence/numbering/numbering';
import { parseMutations } from '@/shared/sequence/construct/mutation';
import { readDnaRecords } from '@/shared/sequence/construct/read-dna';
import { designComplementaryPair } from '@/shared/sequence/primers/complementary-pair';
import { placeChanges, preparePrimerConstruct, type CodingChange } from '@/shared/sequence/primers/construct';
import { pairRuleCelsius } from '@/shared/sequence/primers/limits';
import { meltingCelsius } from '@/shared/sequence/primers/melting';
import { DEFAULT_MELTING_CONDITIONS } from '@/shared/sequence/primers/melting-conditions';
import { draftWindow, proveDraft } from '@/shared/sequence/primers/pair-design';
import { DEFAULT_PAIR_SETTINGS } from '@/shared/sequence/primers/pair-settings';
import { pairWindow, type PairWindow } from '@/shared/sequence/primers/pair-window';
import { readFixtureJson, readFixtureText } from '../../support/read-fixture';

// An invented circular construct; each product was built and compared with Biopython 1.80 (source field of the file).
interface Worked {
  short: string;
  codonNumber: number;
  codonStart0InConstruct: number;
  oldCodon: string;
  newCodon: string;
  changedBases: number;
  complementaryPair: {
    forward: string;
    reverse: string;
    length: number;
    start0: number;
    gc: number;
    mismatches: number;
    tmRuleOfThumbC: number;
    tmNNOnMutatedC: number;
    tmNNOnOriginalC: number | null;
  };
}
const file = readFixtureJson<{
  construct: string;
  orfStart0: number;
  orfEnd0_afterStop: number;
  protein: string;
  cases: Worked[];
}>('mutagenesis-checks.json');
/** Condition C of tm-checks.json: 50 mM sodium, primer 500 nM in excess. */
const CONDITION_C = { ...DEFAULT_MELTING_CONDITIONS, sodiumMillimolar: 50, oligoNanomolar: 500 };

function codingOf(bases: string, start: number, circular = true): Coding {
  const { value, issues } = readCoding({ bases, circular, start, table: 11 });
  if (value === null) throw new Error(issues.map(({ message }) => message).join(' '));
  return value;
}

function changesOf(mutation: string, coding: Coding): CodingChange[] {
  const [request] = parseMutations(mutation).value ?? [];
  const checked = request
    ? checkMutant(request, coding.protein, sequenceNumbering(coding.protein.length)).value
    : null;
  const placed = checked ? placeChanges(checked, coding).value : null;
  if (placed === null) throw new Error(`${mutation} cannot be placed`);
  return placed;
}

const coding = codingOf(file.construct, file.orfStart0 + 1);
const construct = preparePrimerConstruct(file.construct, coding);

/** Design rule of the file: 15 bases on each side of the codon, each side lengthened until its end is G or C. */
function windowOfTheFile(along: number, codonTo: string): PairWindow | null {
  const isStrong = (base: string | undefined) => base === 'G' || base === 'C';
  let before = 15;
  let behind = 15;
  for (;;) {
    const window = pairWindow(construct, [{ along, codonTo }], before, behind);
    if (!window) return null;
    const startsStrong = isStrong(window.changed[0]);
    const endsStrong = isStrong(window.changed[window.length - 1]);
    if (startsStrong && endsStrong) return window;
    if (!startsStrong) before += 1;
    if (!endsStrong) behind += 1;
  }
}

test('the worked construct encodes its protein', () => {
  expect(coding.protein).toBe(file.protein);
  expect(coding.length).toBe(file.orfEnd0_afterStop - file.orfStart0);
});

describe.each(file.cases)('worked mutation $short', (worked) => {
  const pair = worked.complementaryPair;
  const along = construct.codingStart + 3 * (worked.codonNumber - 1);
  const window = windowOfTheFile(along, worked.newCodon);
  const changes = changesOf(worked.short, coding);
  const change = changes[0];
  const draft =
    window && change
      ? draftWindow(
          construct,
          [
            {
              residueIndex: change.residueIndex,
              label: change.label,
              from: change.from,
              to: change.to,
              codonFrom: worked.oldCodon,
              codonTo: worked.newCodon,
              codonStart: coding.codonStarts[change.codon] ?? coding.start,
              changedBases: worked.changedBases,
              hostShare: null,
              chosenBy: 'host',
            },
          ],
          window,
          { ...DEFAULT_PAIR_SETTINGS, melting: CONDITION_C, name: worked.short },
        )
      : null;
  const design = draft ? proveDraft(construct, changes, draft) : null;

  test('the pair of the same rule has the same letters, place and figures', () => {
    const [forward, reverse] = design?.primers ?? [];
    expect(forward?.bases).toBe(pair.forward);
    expect(reverse?.bases).toBe(pair.reverse);
    expect(forward?.start).toBe(pair.start0);
    expect(forward?.length).toBe(pair.length);
    expect((forward?.gcPercent ?? 0) / 100).toBeCloseTo(pair.gc, 4);
    expect(window?.mismatches).toBe(pair.mismatches);
    expect(coding.codonStarts[worked.codonNumber - 1]).toBe(worked.codonStart0InConstruct);
    expect(Math.abs((forward?.meltingCelsius ?? 0) - pair.tmNNOnMutatedC)).toBeLessThanOrEqual(0.1);
    if (pair.tmNNOnOriginalC === null) expect(forward?.annealingBasis).toBe('matched-arm');
    else {
      expect(forward?.annealingBasis).toBe('whole-with-mismatch');
      expect(Math.abs((forward?.annealingCelsius ?? 0) - pair.tmNNOnOriginalC)).toBeLessThanOrEqual(0.1);
    }
  });

  test('the pair rule gives the worked value and its verdict', () => {
    expect(pairRuleCelsius(pair.length, 100 * pair.gc, pair.mismatches)).toBeCloseTo(pair.tmRuleOfThumbC, 1);
    const check = design?.checks.find(({ name }) => name === 'pair-rule-melting');
    expect(check?.value).toBeCloseTo(pair.tmRuleOfThumbC, 2);
    expect(check?.passed).toBe(pair.tmRuleOfThumbC >= 78);
  });

  test('its product is the construct with this codon exchanged', () => {
    const at = worked.codonStart0InConstruct;
    expect(design?.product).toBe(
      file.construct.slice(0, at) + worked.newCodon + file.construct.slice(at + 3),
    );
    expect(design?.proved).toBe(true);
  });

  test('the best design keeps every limit', () => {
    const { value } = designComplementaryPair(construct, changes, {
      melting: CONDITION_C,
      name: worked.short,
    });
    expect(value?.[0]?.withinLimits).toBe(true);
    expect(value?.every(({ proved }) => proved)).toBe(true);
    expect(new Set(value?.map(({ changes: [first] }) => first?.codonTo)).has(worked.newCodon)).toBe(true);
  });
});

// Acceptance row 49 of the handbook.
test('D61N with 15 bases on each side misses the pair rule with 74.86 °C', () => {
  expect(pairRuleCelsius(33, (100 * 16) / 33, 2)).toBeCloseTo(74.86, 2);
});

describe('V. cholerae, c subunit (atpE)', () => {
  const records = readDnaRecords(readFixtureText('dna/vcholerae_atp_cds.fasta')).value ?? [];
  const record = records.find(({ name }) => name === 'VIBCH_atpE');
  const bases = record?.bases ?? '';
  const linear = codingOf(bases, 1, false);
  const carboxylate =
    linear.protein.lastIndexOf('E') > 55 ? linear.protein.indexOf('E', 55) : linear.protein.indexOf('D', 55);
  const letter = linear.protein.charAt(carboxylate);
  const asked = `${letter}${carboxylate + 1}Q`;

  test('the acid of the second helix is exchanged, alone', () => {
    expect('DE').toContain(letter);
    const made = designComplementaryPair(preparePrimerConstruct(bases, linear), changesOf(asked, linear), {
      name: asked,
    });
    expect(made.issues.map(({ code }) => code)).toEqual(['linear-construct']);
    const [best] = made.value ?? [];
    expect(best?.withinLimits).toBe(true);
    const wanted = `${linear.protein.slice(0, carboxylate)}Q${linear.protein.slice(carboxylate + 1)}`;
    for (const design of made.value ?? []) {
      expect(design.encodes).toBe(wanted);
      const [forward, reverse] = design.primers;
      // By hand: the forward primer with its change undone lies on the gene, the reverse pairs with the forward.
      const { start = 0, length = 0 } = forward ?? {};
      const beneath = bases.slice(start, start + length);
      const differing = [...beneath].flatMap((base, index) =>
        base === forward?.bases[index] ? [] : [start + index],
      );
      expect(differing.every((place) => Math.floor(place / 3) === carboxylate)).toBe(true);
      expect([...complement(reverse?.bases ?? '')].reverse().join('')).toBe(forward?.bases);
      expect(forward?.meltingCelsius).toBeCloseTo(
        meltingCelsius(forward?.bases ?? '', DEFAULT_MELTING_CONDITIONS) ?? 0,
        6,
      );
    }
  });
});
