import { alignments, families, projects, type Family, type Protein } from '@/shared/contracts';
import { addMember, makeProject, signUp, type TestPerson } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';
import { stageAlignment } from '../../support/stage';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const text = (value: string) => new TextEncoder().encode(value);
const labelsOf = (protein: Protein, name: string): string[] =>
  (protein.numberings.find((one) => one.name === name)?.segments ?? []).flatMap(
    ({ length, firstNumber, suffix }) => Array.from({ length }, (_, k) => `${firstNumber + k}${suffix}`),
  );

async function familyNamed(person: TestPerson, projectId: string, name: string): Promise<Family> {
  const found = (await person.must(families.list, { params: { projectId } })).find(
    (one) => one.name === name,
  );
  if (!found) throw new Error(`No family ${name}.`);
  return found;
}

async function uploadRows(person: TestPerson, projectId: string, familyId: string, rows: string) {
  const { body } = await person.upload(projectId, { kind: 'alignment', familyId }, 'rows.afa', text(rows));
  const upload = await person.settled(projectId, body.id);
  const proteins = await person.must(families.proteins, { params: { projectId, familyId } });
  return { upload, proteins };
}

describe('families', () => {
  it('come with the project, by its kind of motor', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const list = await lead.must(families.list, { params: { projectId } });
    expect(list.map((family) => family.name)).toEqual(['c', 'γ', 'ε', 'a', 'α', 'β', 'b', 'δ']);
    expect(list.filter((family) => family.catalytic).map((family) => family.name)).toEqual(['β']);
    expect(list.find((family) => family.name === 'γ')?.aliases).toEqual(['gamma']);
  });

  it('are added by a curator, under a name of their own in which capital letters count', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const params = { projectId };
    const body = { name: 'OSCP', aliases: [], part: 'stalk' as const, catalytic: false };
    const made = await lead.must(families.make, { params, body });
    expect(made).toMatchObject({ name: 'OSCP', sort: 8, proteinCount: 0, version: 1 });
    const again = await lead.ask(families.make, { params, body });
    expect([again.status, again.body.code]).toEqual([409, 'family-name-taken']);
    expect((await lead.ask(families.make, { params, body: { ...body, name: 'B' } })).status).toBe(201);
    const contributor = await addMember(lead, projectId, 'contributor');
    expect((await contributor.ask(families.make, { params, body: { ...body, name: 'x' } })).status).toBe(403);
  });
});

describe('the rows of an alignment', () => {
  it('with equal residues are one protein in two rows, with a warning', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const { id: familyId } = await familyNamed(lead, projectId, 'c');
    const rows = '>one\nMENLNMDLLYMAAAVMMGLA\n>two\nMENLNMDLLYMAAAVMMGLA\n>three\nMENLNMDLLYIAAAIMMGLA\n';
    const { upload, proteins } = await uploadRows(lead, projectId, familyId, rows);
    expect(upload.state).toBe('done');
    expect(upload.issues).toEqual([
      expect.objectContaining({ code: 'rows-equal', severity: 'warning', line: 3 }),
    ]);
    expect(proteins.map((protein) => protein.organism)).toEqual(['one', 'three']);
    const read = await lead.must(alignments.read, {
      params: { projectId, alignmentId: upload.alignmentId ?? '' },
    });
    expect(read.rows.map((row) => row.proteinId)).toEqual([
      proteins[0]?.id,
      proteins[0]?.id,
      proteins[1]?.id,
    ]);
  });

  it('named with a range are numbered from its start', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const { id: familyId } = await familyNamed(lead, projectId, 'c');
    const rows = '>E_coli/13-32\nMENLNMDLLYMAAAVMMGLA\n>V_cholerae\nMENLNMDLLYIAAAIMMGLA\n';
    const { proteins } = await uploadRows(lead, projectId, familyId, rows);
    expect(proteins.map((one) => one.organism)).toEqual(['E_coli', 'V_cholerae']);
    const protein = await lead.must(families.protein, {
      params: { projectId, proteinId: proteins[0]?.id ?? '' },
    });
    expect(labelsOf(protein, 'sequence').slice(0, 2)).toEqual(['13', '14']);
    const [label] = await server.container.proteins.presentLabels([
      { proteinId: protein.id, residueIndex: 4 },
    ]);
    expect(label).toMatchObject({ label: '17', letter: 'N', family: 'c', organism: 'E_coli', part: 'rotor' });
  });

  it('are the proteins that are there already, also under another organism given by hand', async () => {
    const stage = await stageAlignment(server);
    const { lead, projectId, familyId } = stage;
    const ecoli = stage.protein('ATPE_ECOLI');
    await lead.must(families.renameProtein, {
      params: { projectId, proteinId: ecoli.id },
      version: ecoli.version,
      body: { organism: 'Escherichia coli' },
    });
    await lead.uploadFixture(projectId, { kind: 'alignment', familyId }, 'alignments/c_small_mafft.afa');
    const proteins = await lead.must(families.proteins, { params: { projectId, familyId } });
    expect(proteins).toHaveLength(5);
    expect(proteins.find((one) => one.id === ecoli.id)?.organism).toBe('Escherichia coli');
    // A second alignment does not become the reference by itself.
    expect((await familyNamed(lead, projectId, 'c')).referenceAlignmentId).toBe(stage.alignmentId);
  });
});

describe('a protein', () => {
  it('gets an offset numbering without a zero, preferred in its family, and can change it', async () => {
    const stage = await stageAlignment(server);
    const { lead, projectId, familyId } = stage;
    const { id: proteinId } = stage.protein('ATPE_VIBCH');
    const params = { projectId, proteinId };
    const body = { name: 'mature', offset: -3, skipZero: true, preferred: true };
    const protein = await lead.must(families.setOffsetNumbering, { params, version: 1, body });
    expect(protein).toMatchObject({ preferredNumbering: 'mature', version: 2 });
    expect(labelsOf(protein, 'mature').slice(0, 5)).toEqual(['-3', '-2', '-1', '1', '2']);
    const refs = [0, 3].map((residueIndex) => ({ proteinId, residueIndex }));
    const others = [{ proteinId: stage.protein('ATPE_ECOLI').id, residueIndex: 3 }];
    const labels = await server.container.proteins.presentLabels([...refs, ...others]);
    expect(labels.map(({ label, numbering }) => `${numbering} ${label}`)).toEqual([
      'mature -3',
      'mature 1',
      'sequence 4',
    ]);
    const { events } = await lead.must(projects.events, { params: { projectId }, query: { after: 0 } });
    expect(events.slice(-2).map((event) => [event.kind, event.subjectId])).toEqual([
      ['family.changed', familyId],
      ['protein.changed', proteinId],
    ]);
    const changed = await lead.must(families.setOffsetNumbering, {
      params,
      version: 2,
      body: { ...body, offset: 0, skipZero: false, preferred: false },
    });
    expect(labelsOf(changed, 'mature')[0]).toBe('1');
    expect(changed.preferredNumbering).toBe('sequence');
    expect(changed.numberings).toHaveLength(2);
  });

  it('keeps the numbering it was born with, and its version', async () => {
    const stage = await stageAlignment(server);
    const { lead, projectId } = stage;
    const params = { projectId, proteinId: stage.protein('ATPE_ECOLI').id };
    const body = { name: 'sequence', offset: 5, skipZero: false, preferred: true };
    const born = await lead.ask(families.setOffsetNumbering, { params, version: 1, body });
    expect([born.status, born.body.code]).toEqual([409, 'numbering-name-taken']);
    const stale = await lead.ask(families.setOffsetNumbering, {
      params,
      version: 7,
      body: { ...body, name: 'mature' },
    });
    expect(stale).toMatchObject({ status: 412, body: { code: 'stale-version', current: { version: 1 } } });
    const contributor = await addMember(lead, projectId, 'contributor');
    const denied = await contributor.ask(families.setOffsetNumbering, {
      params,
      version: 1,
      body: { ...body, name: 'mature' },
    });
    expect(denied.status).toBe(403);
  });

  it('cannot be renamed to what makes it the same as another', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const { id: familyId } = await familyNamed(lead, projectId, 'c');
    const rows = (name: string) => `>${name}\nMENLNMDLLYMAAAVMMGLA\n>other\nMENLNMDLLYIAAAIMMGLA\n`;
    await uploadRows(lead, projectId, familyId, rows('one'));
    const { proteins } = await uploadRows(lead, projectId, familyId, rows('two'));
    expect(proteins.map((protein) => protein.organism)).toEqual(['one', 'other', 'two']);
    const two = proteins[2];
    const answer = await lead.ask(families.renameProtein, {
      params: { projectId, proteinId: two?.id ?? '' },
      version: 1,
      body: { organism: 'one' },
    });
    expect([answer.status, answer.body.code]).toEqual([409, 'protein-taken']);
  });
});

describe('labels of residues', () => {
  it('take four queries, for one residue and for five thousand', async () => {
    const stage = await stageAlignment(server);
    // Each read outside a unit takes a query runner of its own.
    const runners = jest.spyOn(server.container.source, 'createQueryRunner');
    const queriesFor = async (refs: { proteinId: string; residueIndex: number }[]) => {
      runners.mockClear();
      expect(await server.container.proteins.presentLabels(refs)).toHaveLength(refs.length);
      return runners.mock.calls.length;
    };
    const { id: proteinId } = stage.protein('ATPE_ECOLI');
    const other = { proteinId: stage.protein('ATPE_VIBCH').id, residueIndex: 3 };
    const many = Array.from({ length: 5000 }, (_, at) => ({ proteinId, residueIndex: at % 79 }));
    expect(await queriesFor([...many, other])).toBe(4);
    expect(await queriesFor(many.slice(0, 1))).toBe(4);
    runners.mockRestore();
  });
});
