import { makeScenario, type Scenario } from '@/shared/scenario/scenario';

const scenario = makeScenario();
const { story, alignments, structure, people, construct } = scenario;

const texts = (of: Scenario): { text: string; organism: string }[] => [
  ...of.story.annotations.map(({ text, residues }) => ({ text, organism: residues[0]?.organism ?? '' })),
  ...of.story.threads.flatMap(({ residue, messages }) =>
    messages.map(({ text }) => ({ text, organism: residue.organism })),
  ),
  ...of.story.mutants.map(({ reason }) => ({ text: reason, organism: of.modelOrganism })),
];

const residueWord = /([caβγ])([A-Z])(\d+)([A-Z])?/g;
const chainWord = /\b([A-Z]):(\d+)/g;

describe('what the team wrote', () => {
  it('fills every mark, whatever the seed', () => {
    for (const seed of [1, 2, 3]) {
      for (const { text } of texts(makeScenario(seed))) expect(text).not.toMatch(/[{}]|undefined|NaN/);
    }
    for (const { text } of texts(scenario)) expect(text).not.toMatch(/[{}]|undefined|NaN/);
  });

  it('names only residues that are there, in the model organism or in one that the text names', () => {
    let words = 0;
    for (const { text, organism } of texts(scenario)) {
      for (const [word, family = '', letter = '', digits = ''] of text.matchAll(residueWord)) {
        words += 1;
        const allowed = scenario.organisms.filter(
          (name) => name === organism || name === scenario.modelOrganism || text.includes(name),
        );
        const holders = allowed.filter((name) => {
          const residues = proteinOf(family, name);
          const offsets = [
            0,
            ...story.numberings
              .filter((numbering) => numbering.family === family && numbering.organism === name)
              .map((numbering) => numbering.offset),
          ];
          return offsets.some((offset) => residues.charAt(Number(digits) - 1 - offset) === letter);
        });
        expect([word, holders.length > 0]).toEqual([word, true]);
      }
    }
    expect(words).toBeGreaterThan(30);
  });

  it('names only author numbers that are in the model', () => {
    const named = texts(scenario).flatMap(({ text }) => [...text.matchAll(chainWord)]);
    expect(named.length).toBeGreaterThan(3);
    for (const [, id, digits] of named) {
      const chain = structure.chains.find((candidate) => candidate.id === id);
      expect(chain?.residues.some(({ authorNumber }) => authorNumber === Number(digits))).toBe(true);
    }
  });

  it('says which author numbers the carboxylate and the arginine have', () => {
    const all = texts(scenario)
      .map(({ text }) => text)
      .join('\n');
    const carboxylate = /K:(\d+) and A:(\d+)/.exec(all);
    const [k, a] = [Number(carboxylate?.[1]), Number(carboxylate?.[2])];
    expect(columnOf('c', indexOfAuthor('K', k))).toBe(siteColumn('c', 'carboxylate'));
    expect(columnOf('a', indexOfAuthor('A', a))).toBe(siteColumn('a', 'essential arginine'));
    const missing = /A:(\d+) to A:(\d+) are not in the coordinates/.exec(all);
    const numbers = structure.chains
      .find(({ id }) => id === 'A')
      ?.residues.filter(({ observed }) => !observed)
      .map(({ authorNumber }) => authorNumber);
    const [first, last] = [Number(missing?.[1]), Number(missing?.[2])];
    for (let number = first; number <= last; number += 1) expect(numbers).toContain(number);
    expect(numbers).not.toContain(first - 1);
    expect(numbers).not.toContain(last + 1);
  });

  it('counts the letters in the column of the carboxylate as the file has them', () => {
    const column = siteColumn('c', 'carboxylate') ?? -1;
    const letters = rowsOf('c').map((row) => row.text.charAt(column));
    const count = (letter: string) => letters.filter((held) => held === letter).length;
    expect(story.annotations[0]?.text).toContain(
      `E in ${count('E')} rows, D in ${count('D')} and Q in ${count('Q')}`,
    );
  });

  it('gives distances as they are in the file', () => {
    const arginine = cbInFile('A', siteIndex('a', 'essential arginine') + 1 - 8);
    const distances = [...'KLMNOPQRST']
      .map((id) => {
        const cb = cbInFile(id, siteIndex('c', 'carboxylate') + 1);
        return { id, apart: Math.hypot(...cb.map((value, axis) => value - (arginine[axis] ?? NaN))) };
      })
      .sort((first, second) => first.apart - second.apart);
    const [nearest, second] = distances;
    const facing = story.annotations.find(({ kind }) => kind === 'facing charge')?.text;
    expect(nearest?.id).toBe('K');
    expect(facing).toContain(`${nearest?.apart.toFixed(1)} Å`);
    expect(facing).toContain(`chain ${second?.id} at ${second?.apart.toFixed(1)} Å`);
    // "Copy 1 is the only one under 10 Å"
    expect(distances.filter(({ apart }) => apart < 10)).toHaveLength(1);
  });

  it('says of a column what is true of all its rows', () => {
    for (const name of ['P-loop lysine', 'catalytic acid', 'Walker B acid']) {
      const column = siteColumn('β', name) ?? -1;
      expect(new Set(rowsOf('β').map((row) => row.text.charAt(column))).size).toBe(1);
    }
    const swapped = (name: string, organism: string) =>
      rowsOf('a')
        .find((row) => row.organism === organism)
        ?.text.charAt(siteColumn('a', name) ?? -1);
    expect(swapped('p-side acid', 'Thermolira ampla')).toBe(
      swapped('p-side partner', scenario.modelOrganism),
    );
    expect(swapped('p-side partner', 'Thermolira ampla')).toBe(
      swapped('p-side acid', scenario.modelOrganism),
    );
  });
});

describe('who wrote it', () => {
  const roles = new Map(people.map(({ key, role }) => [key, role]));
  const writers = ['contributor', 'curator', 'lead'];
  const deciders = ['curator', 'lead'];

  it('is somebody who may', () => {
    for (const { author } of [...story.annotations, ...story.mutants]) {
      expect(writers).toContain(roles.get(author));
    }
    for (const { messages } of story.threads) {
      for (const { author } of messages) expect(writers).toContain(roles.get(author));
    }
    for (const { status, decidedBy = '', reason } of story.annotations) {
      if (status === 'accepted' || status === 'retired') expect(deciders).toContain(roles.get(decidedBy));
      if (status === 'contested') expect(writers).toContain(roles.get(decidedBy));
      if (status === 'contested' || status === 'retired') expect(reason).toBeTruthy();
      if (status === 'proposed') expect(decidedBy).toBe('');
    }
  });

  it('are six people in all roles, one of them from outside, with addresses that reach nobody', () => {
    expect(people).toHaveLength(6);
    expect(new Set(people.map(({ role }) => role))).toEqual(
      new Set(['lead', 'curator', 'contributor', 'reader']),
    );
    expect(people.filter(({ teamLead }) => teamLead)).toHaveLength(1);
    expect(people.filter(({ outside }) => outside).map(({ role }) => role)).toEqual(['reader']);
    for (const { email } of people) expect(email).toMatch(/^[a-z.]+@[a-z]+\.example$/);
    expect(new Set(people.map(({ email }) => email)).size).toBe(6);
  });
});

describe('what it hangs on', () => {
  it('covers all statuses, all four families and several proteins', () => {
    const { annotations, threads } = story;
    expect(new Set(annotations.map(({ status }) => status)).size).toBe(4);
    const residues = [...annotations.flatMap((annotation) => annotation.residues)];
    expect(new Set(residues.map(({ family }) => family)).size).toBe(4);
    expect(new Set(residues.map(({ organism }) => organism)).size).toBeGreaterThan(2);
    expect(annotations.map((annotation) => annotation.residues.length)).toEqual([1, 2, 1, 1, 1, 1, 1, 1]);
    expect(threads.map(({ messages }) => messages.length)).toEqual([6, 4, 3, 3]);
  });

  it('plans mutations whose old letter is there and whose codon is in the construct', () => {
    expect(story.mutants).toHaveLength(4);
    for (const { residue, oldLetter, newLetter } of story.mutants.flatMap(({ mutations }) => mutations)) {
      expect(proteinOf(residue.family, residue.organism).charAt(residue.index)).toBe(oldLetter);
      expect(newLetter).not.toBe(oldLetter);
      const codon = construct.codons.find(({ index }) => index === residue.index);
      expect(codon?.letter).toBe(oldLetter);
      expect([construct.family, construct.organism]).toEqual([residue.family, residue.organism]);
    }
  });
});

function rowsOf(family: string) {
  return alignments.find((alignment) => alignment.family === family)?.rows ?? [];
}

function proteinOf(family: string, organism: string): string {
  return rowsOf(family).find((row) => row.organism === organism)?.residues ?? '';
}

function siteColumn(family: string, name: string): number | undefined {
  return alignments.find((alignment) => alignment.family === family)?.sites[name];
}

function columnOf(family: string, index: number): number | undefined {
  return rowsOf(family).find((row) => row.organism === scenario.modelOrganism)?.columns[index];
}

function siteIndex(family: string, name: string): number {
  const row = rowsOf(family).find((candidate) => candidate.organism === scenario.modelOrganism);
  return row?.columns.findIndex((column) => column === siteColumn(family, name)) ?? -1;
}

function indexOfAuthor(id: string, number: number): number {
  const chain = structure.chains.find((candidate) => candidate.id === id);
  return chain?.residues.find(({ authorNumber }) => authorNumber === number)?.index ?? -1;
}

/** Coordinates of a Cβ, cut from the columns of the file. */
function cbInFile(chain: string, number: number): number[] {
  const line = structure.text
    .split('\n')
    .find(
      (candidate) =>
        candidate.startsWith('ATOM') &&
        candidate.slice(12, 16) === ' CB ' &&
        candidate.charAt(21) === chain &&
        Number(candidate.slice(22, 26)) === number,
    );
  return [30, 38, 46].map((start) => Number(line?.slice(start, start + 8)));
}
