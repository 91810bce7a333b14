// Constructs, mutants and primers on a real coding sequence: atpE of V. cholerae for the row ATPE_VIBCH.
import { plans, projects, type Design, type Mutant } from '@/shared/contracts';
import { addMember, type TestPerson } from '@/tests/support/person';
import { readFixtureJson, readFixtureText } from '@/tests/support/read-fixture';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { codingBases, codingRecord, stageAlignment, stageConstruct, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
let contributor: TestPerson;
let constructId: string;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  contributor = await addMember(stage.lead, stage.projectId, 'contributor');
  constructId = (await stageConstruct(stage)).id;
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
const proteinId = () => stage.protein('ATPE_VIBCH').id;
const bases = codingBases('VIBCH_atpE');
/** The row of the alignment, without gaps. */
const residuesOf = (row: string) => {
  const record =
    readFixtureText('alignments/c_small_mafft.afa')
      .split('>')
      .find((one) => one.startsWith(row)) ?? '';
  return record.split('\n').slice(1).join('').replaceAll('-', '');
};

// Source: NCBI translation tables as shipped in Biopython 1.80 (genetic-codes.json), code 11.
const code11 = readFixtureJson<{ codes: Record<string, { aminoAcids: string }> }>('genetic-codes.json').codes[
  '11'
];
const translate = (dna: string): string =>
  Array.from({ length: Math.floor(dna.length / 3) }, (_, codon) => {
    const [one, two, three] = [0, 1, 2].map((at) => 'TCAG'.indexOf(dna.charAt(codon * 3 + at)));
    return code11?.aminoAcids.charAt((one ?? 0) * 16 + (two ?? 0) * 4 + (three ?? 0));
  }).join('');
const opposite = (dna: string) =>
  [...dna]
    .reverse()
    .map((base) => 'TGCA'.charAt('ACGT'.indexOf(base)))
    .join('');

const construct = (change: object = {}) =>
  contributor.ask(plans.makeConstruct, {
    ...of(),
    body: {
      name: 'pVc',
      dna: bases,
      codingStart: 1,
      circular: false,
      geneticCode: 11,
      proteinId: proteinId(),
      ...change,
    },
  });
const plan = (changes: string, more: object = {}) =>
  contributor.ask(plans.makeMutant, {
    ...of(),
    body: { proteinId: proteinId(), changes, constructId, reason: '', ...more },
  });
const design = ({ id, version }: Mutant, more: object = {}) =>
  contributor.ask(plans.design, {
    ...of({ mutantId: id }),
    version,
    body: { constructId, host: 'ecoli', ...more },
  });

test('the coding sequence of atpE is a construct of its protein, residue for residue', async () => {
  const { status, body } = await construct({ dna: codingRecord('VIBCH_atpE') });
  expect(status).toBe(201);
  expect(body).toMatchObject({
    bases,
    codingStart: 0,
    codingLength: bases.length,
    encoded: residuesOf('ATPE_VIBCH'),
    organism: 'ATPE_VIBCH',
    family: 'c',
    segments: [{ codonStart: 0, proteinStart: 0, length: 85 }],
    issues: [],
    version: 1,
  });
  expect(translate(bases)).toBe(`${body.encoded}*`);
  const list = await stage.lead.must(plans.constructs, of());
  expect(list.find(({ id }) => id === body.id)).toEqual(body);
});

/** Puts the primers back into the construct, as the reaction does: what they cover becomes what they say. */
function productOf({ primers }: Design): string {
  const forward = primers.find(({ strand }) => strand === '+');
  const reverse = primers.find(({ strand }) => strand === '-');
  if (!forward || !reverse) throw new Error('a pair has two primers');
  // A complementary pair: each is the other's opposite.
  expect(opposite(reverse.bases)).toBe(forward.bases);
  expect([forward.bases.length, reverse.length]).toEqual([forward.length, forward.length]);
  return bases.slice(0, forward.start) + forward.bases + bases.slice(forward.start + forward.length);
}

test.each(['D60Q', 'D60N', 'R40K+Q41E', 'K33M'])(
  '%s: the DNA its primers make encodes that change and no other, in every design shown',
  async (changes) => {
    const planned = await plan(changes);
    expect([planned.status, planned.body.name, planned.body.state]).toEqual([201, changes, 'planned']);
    const { status, body } = await design(planned.body);
    expect([status, body.detail]).toEqual([200, undefined]);
    expect(body.state).toBe('designed');
    expect(body.designs.length).toBeGreaterThan(0);
    expect(body.designs.map(({ rank }) => rank)).toEqual(body.designs.map((_, at) => at + 1));
    const wanted = [...residuesOf('ATPE_VIBCH')];
    for (const change of changes.split('+')) wanted[Number(change.slice(1, -1)) - 1] = change.slice(-1);
    for (const one of body.designs) {
      expect(one.proved).toBe(true);
      expect(translate(productOf(one))).toBe(`${wanted.join('')}*`);
      for (const { codonStart, codonFrom, codonTo } of one.codons) {
        expect(bases.slice(codonStart, codonStart + 3)).toBe(codonFrom);
        expect(productOf(one).slice(codonStart, codonStart + 3)).toBe(codonTo);
      }
    }
  },
);

test('a design made again replaces what was there, under a new version; one is chosen', async () => {
  const { body: planned } = await plan('D60Q');
  const { body: first } = await design(planned);
  const { body: second } = await design(first, { host: 'yeast' });
  expect([planned.version, first.version, second.version]).toEqual([1, 2, 3]);
  const ids = first.designs.map(({ id }) => id);
  expect(second.designs.some(({ id }) => ids.includes(id))).toBe(false);
  const choose = (mutant: Mutant, designId = '') =>
    contributor.ask(plans.choose, {
      ...of({ mutantId: mutant.id }),
      version: mutant.version,
      body: { designId },
    });
  const { body: chosen } = await choose(second, second.designs[0]?.id);
  expect(chosen.designs.map((one) => one.chosen)).toEqual(second.designs.map((_, at) => at === 0));
  const { body: other } = await choose(chosen, second.designs[1]?.id);
  expect(other.designs.filter((one) => one.chosen).map(({ id }) => id)).toEqual([second.designs[1]?.id]);
  expect((await choose(other, ids[0])).status).toBe(404);
  expect(await stage.lead.must(plans.mutant, of({ mutantId: planned.id }))).toEqual(other);
});

describe('a change that cannot be', () => {
  test('whose letter is not there says what stands there, and where one stands near', async () => {
    const { status, body } = await plan('E60Q');
    expect([status, body.code]).toEqual([422, 'mutation-refused']);
    const row = residuesOf('ATPE_VIBCH');
    const near = [...row].flatMap((letter, at) => (letter === 'E' ? [at + 1] : []));
    const nearest = near.sort((one, other) => Math.abs(one - 60) - Math.abs(other - 60))[0];
    expect(body.detail).toBe(`E60Q: at 60 stands Asp (D), not Glu (E). The nearest E stands at ${nearest}.`);
    expect(body.issues).toEqual([
      expect.objectContaining({ code: 'mutation-letter-differs', residue: '60' }),
    ]);
    expect(body.fields?.[0]?.path).toBe('changes');
  });

  test.each([
    ['D60', 'mutation-unreadable'],
    ['xyz', 'mutation-unreadable'],
    ['=D60Q', 'mutation-unreadable'],
    ['<b>D60Q', 'mutation-unreadable'],
    ['D60D', 'mutation-without-change'],
    ['D999Q', 'mutation-label-unknown'],
    ['D60Q+D60N', 'mutation-twice'],
    ['D60*', 'mutation-not-yet'],
    ['p.Asp60Gln', 'mutation-not-yet'],
  ])('%s: %s', async (changes, code) => {
    const { status, body } = await plan(changes);
    expect([status, body.code, body.issues?.map((issue) => issue.code)]).toEqual([
      422,
      'mutation-refused',
      [code],
    ]);
    expect(body.detail).toBeTruthy();
  });

  test('several mutants at once, too long a text, too long a reason', async () => {
    expect((await plan('D60Q, V62A')).body.detail).toMatch(/one mutant at a time/);
    expect((await plan('D60Q+'.repeat(2000))).status).toBe(400);
    expect((await plan('D60Q', { reason: 'x'.repeat(10_000) })).status).toBe(400);
    expect((await plan('   ')).status).toBe(400);
  });
});

describe('DNA that cannot be used', () => {
  const inner = `${bases.slice(0, 90)}TAA${bases.slice(93)}`;
  const lost = bases.slice(0, 91) + bases.slice(92);
  test.each([
    [
      'not in frame',
      { codingStart: 2 },
      'protein-not-encoded',
      'The whole protein is encoded from base 1 on the strand as given.',
    ],
    [
      'with a stop inside',
      { dna: inner },
      'protein-not-encoded',
      'breaks at residue 31 (G), where a stop follows base 90.',
    ],
    [
      'with a base lost',
      { dna: lost },
      'protein-not-encoded',
      'breaks at residue 31 (G), base 91, where the DNA reads A.',
    ],
    ['of another subunit', { dna: codingRecord('VIBCH_atpF') }, 'protein-not-encoded', 'breaks at residue'],
    [
      'that starts behind its end',
      { codingStart: 5000 },
      'start-outside',
      'the construct has bases 1 to 258',
    ],
    ['empty', { dna: ' \n\n' }, 'empty', 'nothing to read'],
    ['of two records', { dna: `>a\n${bases}\n>b\n${bases}` }, 'several-records', 'choose one: a, b'],
    [
      'that is a protein',
      { dna: residuesOf('ATPE_VIBCH') },
      'looks-like-protein',
      'paste the DNA that encodes it',
    ],
    ['that is no text', { dna: '\u0000\u0001PK' }, 'binary', 'not a text file'],
    ['with markup', { dna: `<b>${bases}</b>` }, 'unknown-base', 'is no base'],
  ])('%s: says so, where it breaks, and stores nothing', async (_, change, code, words) => {
    const before = await stage.lead.must(projects.read, of());
    const { status, body } = await construct(change);
    expect(status).toBe(422);
    expect(body.issues?.filter(({ severity }) => severity === 'error').map((issue) => issue.code)).toContain(
      code,
    );
    expect(body.detail).toContain(words);
    expect(body.fields).toHaveLength(1);
    expect((await stage.lead.must(projects.read, of())).head).toBe(before.head);
  });

  test('unknown letters are named with line and column', async () => {
    const { body } = await construct({ dna: `>x\n${bases.slice(0, 60)}\n${bases.slice(60)}XZ` });
    expect(
      body.issues?.filter((issue) => issue.code === 'unknown-base').map(({ line, column }) => [line, column]),
    ).toEqual([
      [3, bases.length - 60 + 1],
      [3, bases.length - 60 + 2],
    ]);
  });

  test.each([
    ['a name of 10,000 characters', { name: 'x'.repeat(10_000) }, 'name'],
    ['an empty name', { name: ' ' }, 'name'],
    ['more than half a million characters', { dna: 'A'.repeat(500_001) }, 'dna'],
    ['a start at 0', { codingStart: 0 }, 'codingStart'],
  ])('%s is refused at its field', async (_, change, path) => {
    const { status, body } = await construct(change);
    expect([status, body.fields?.map((field) => field.path)]).toEqual([400, [path]]);
  });

  test('a genetic code that is not offered', async () => {
    for (const geneticCode of [0, 99, -1]) {
      const { status, body } = await construct({ geneticCode });
      expect([geneticCode, status, body.code]).toEqual([geneticCode, 422, 'unknown-genetic-code']);
    }
  });
});

test('a construct that already differs is told so, and no change is designed on a letter that is not there', async () => {
  const changed = `${bases.slice(0, 177)}GCG${bases.slice(180)}`;
  const { status, body } = await construct({ dna: changed, name: 'pVc-D60A' });
  expect(status).toBe(201);
  expect(body.issues).toEqual([
    expect.objectContaining({ code: 'encoded-mismatch', severity: 'warning', residue: '60' }),
  ]);
  const { body: planned } = await plan('D60Q');
  const answer = await design(planned, { constructId: body.id });
  expect([answer.status, answer.body.code]).toEqual([422, 'no-design']);
  expect(answer.body.detail).toMatch(/60/);
  const now = await stage.lead.must(plans.mutant, of({ mutantId: planned.id }));
  expect([now.state, now.designs, now.version]).toEqual(['planned', [], 1]);
});

test('a change planned on one protein is not designed in a construct of another', async () => {
  const ecoli = await contributor.ask(plans.makeMutant, {
    ...of(),
    body: { proteinId: stage.protein('ATPE_ECOLI').id, changes: 'D61N', constructId: null, reason: '' },
  });
  const answer = await design(ecoli.body);
  expect([answer.status, answer.body.code]).toEqual([422, 'other-protein']);
});

describe('the primer list', () => {
  const read = async (): Promise<string[]> => {
    const { status, headers, body } = await stage.lead.ask(plans.primerList, of());
    expect(status).toBe(200);
    expect(headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(headers.get('content-disposition')).toBe('attachment; filename=primers.csv');
    return String(body)
      .replace(/^\uFEFF/, '')
      .trimEnd()
      .split('\r\n');
  };

  // Source: handbook 13 and row 56 of its acceptance checks.
  test('holds the caution, first and last, and one line a primer', async () => {
    const { body: planned } = await plan('A39G');
    const { body: designed } = await design(planned);
    const lines = await read();
    const caution =
      "Check the design before you order. Follow your institution's rules on biosafety and recombinant DNA; this tool does not replace review by a qualified person.";
    for (const line of [lines[0], lines.at(-1)]) {
      expect(line).toContain(caution);
      expect(line).toContain('Calculated for the stated concentrations; real reactions differ.');
    }
    const own = lines.filter((line) => line.startsWith('A39G'));
    expect(own).toHaveLength(2);
    const best = designed.designs[0];
    best?.primers.forEach((primer, at) => {
      const cells = own[at]?.split(',') ?? [];
      expect(cells.slice(0, 3)).toEqual([primer.name, primer.bases, String(primer.length)]);
      expect(Number(cells[3])).toBeCloseTo(primer.gcPercent, 1);
      expect(Number(cells[4])).toBeCloseTo(primer.meltingCelsius ?? NaN, 1);
    });
    expect(own[0]).toContain('A39G and no other change.');
  });

  test('takes the chosen design where one is chosen', async () => {
    const { body: planned } = await plan('A38G');
    const { body: designed } = await design(planned);
    const second = designed.designs[1];
    await contributor.must(plans.choose, {
      ...of({ mutantId: planned.id }),
      version: designed.version,
      body: { designId: second?.id ?? '' },
    });
    const lines = await read();
    const sequences = lines.filter((line) => line.startsWith('A38G')).map((line) => line.split(',')[1]);
    expect(sequences).toEqual(second?.primers.map((primer) => primer.bases));
  });

  test.each(['=HYPERLINK("http://evil.example","x")', '+1+1', '-1+1', '@SUM(A1)', "=cmd|' /C calc'!A0"])(
    'a construct called %s does not become a formula',
    async (name) => {
      const made = await construct({ name });
      expect(made.body.name).toBe(name);
      const { body: planned } = await plan('K33M', { constructId: made.body.id });
      await design(planned, { constructId: made.body.id });
      const lines = (await read()).filter((line) => line.includes(name.replaceAll('"', '""')));
      expect(lines.length).toBeGreaterThan(0);
      for (const line of lines) {
        const cells =
          line.match(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)?.map((cell) => cell.replace(/,$/, '')) ?? [];
        for (const cell of cells) expect(cell.replace(/^"/, '')).not.toMatch(/^[=+\-@\t\r]/);
      }
    },
  );

  test('a name with markup stays text, in the list and in the file', async () => {
    const name = '<img src=x onerror=alert(1)>';
    const made = await construct({ name });
    const { body: planned } = await plan('K33M', { constructId: made.body.id });
    await design(planned, { constructId: made.body.id });
    expect((await read()).some((line) => line.includes(name))).toBe(true);
  });
});

test('the list of mutants is of a protein or of a residue when asked so, newest first', async () => {
  const all = await stage.lead.must(plans.mutants, of());
  expect(all.map(({ id }) => id)).toEqual(
    all
      .map(({ id }) => id)
      .sort()
      .reverse(),
  );
  const query = { proteinId: proteinId(), residueIndex: 59 };
  const at60 = await stage.lead.must(plans.mutants, { ...of(), query });
  expect(new Set(at60.map(({ name }) => name))).toEqual(new Set(['D60Q', 'D60N']));
  const ofProtein = await stage.lead.must(plans.mutants, { ...of(), query: { proteinId: proteinId() } });
  expect(ofProtein).toHaveLength(all.length - 1);
});

test('no mutant is left out of the primer list, however many there are', async () => {
  const crowd = await stageAlignment(server, stage.lead);
  const { id } = await stageConstruct(crowd);
  const params = { projectId: crowd.projectId };
  const body = { proteinId: crowd.protein('ATPE_VIBCH').id, changes: 'D60Q', constructId: id, reason: '' };
  const first = await stage.lead.must(plans.makeMutant, { params, body });
  await stage.lead.must(plans.design, {
    params: { ...params, mutantId: first.id },
    version: first.version,
    body: { constructId: id, host: 'ecoli' },
  });
  // Six hundred later ones, still without primers.
  const rows = Array.from({ length: 600 }, (_, at) => [
    `ffffffff-ffff-7fff-bfff-${String(at).padStart(12, '0')}`,
    crowd.projectId,
    id,
    'planned',
    '',
    1,
    new Date(),
    stage.lead.id,
  ]);
  await server.container.source.query(
    'INSERT INTO mutant (id, project_id, construct_id, state, reason, version, created_at, created_by) VALUES ?',
    [rows],
  );
  const { body: csv } = await stage.lead.ask(plans.primerList, { params });
  expect(String(csv).match(/^D60Q_/gm)).toHaveLength(2);
});
