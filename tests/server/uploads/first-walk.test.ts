import { alignments, families, maps, projects, structures, uploads } from '@/shared/contracts';
import { makeProject, signUp, type TestPerson } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';
import { ChainLabel } from '@/server/modules/structures';
import { readFixtureJson } from '../../support/read-fixture';
import { stageAlignment, stageStructure } from '../../support/stage';

jest.setTimeout(60_000);

interface OutsideMapping {
  structure: string;
  chain: string;
  row: string;
  /** Author number, chain letter, column from 1, row letter. */
  mapping: [string, string, number, string][];
}

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const eventsOf = async (person: TestPerson, projectId: string) => {
  const { events } = await person.must(projects.events, { params: { projectId }, query: { after: 0 } });
  return events;
};

describe('the ring of 4BEM with the alignment of its c subunits', () => {
  it('becomes proteins with numberings, an alignment with rows, and the family’s reference', async () => {
    const stage = await stageAlignment(server);
    const { lead, projectId, familyId, alignmentUpload } = stage;
    expect(alignmentUpload).toMatchObject({ state: 'done', alignmentId: stage.alignmentId, stage: '' });
    const family = (await lead.must(families.list, { params: { projectId } })).find(
      ({ id }) => id === familyId,
    );
    expect(family).toMatchObject({ proteinCount: 5, referenceAlignmentId: stage.alignmentId });
    const read = await lead.must(alignments.read, {
      params: { projectId, alignmentId: stage.alignmentId },
    });
    expect(read).toMatchObject({ isReference: true, rowCount: 5, name: 'c_small_mafft', format: 'fasta' });
    expect(read.rows.map((row) => row.text.length)).toEqual(Array(5).fill(read.columnCount));
    for (const row of read.rows) {
      const protein = await lead.must(families.protein, { params: { projectId, proteinId: row.proteinId } });
      expect(protein.residues).toBe(row.text.replace(/[-.]/g, '').toUpperCase());
      expect(protein).toMatchObject({ organism: row.name, preferredNumbering: 'sequence' });
      expect(protein.numberings).toEqual([
        expect.objectContaining({
          name: 'sequence',
          segments: [{ residueIndex: 0, length: protein.length, firstNumber: 1, suffix: '' }],
        }),
      ]);
    }
    const kinds = (await eventsOf(lead, projectId)).map((event) => event.kind);
    expect(kinds).toEqual([
      'upload.changed',
      'upload.changed',
      'family.changed',
      'alignment.changed',
      'upload.changed',
    ]);
  });

  it('is matched to them chain by chain, confirmed at once, and done', async () => {
    const stage = await stageAlignment(server);
    const { lead, projectId } = stage;
    const { upload, structureId } = await stageStructure(stage, 'structures/4bem.pdb', false);
    expect(upload).toMatchObject({ state: 'waiting', structureId });
    const params = { projectId, structureId };
    const before = await lead.must(structures.read, { params });
    expect(before).toMatchObject({ waiting: 10, chainCount: 10 });
    // Source: DBREF records of PDB 4BEM, chains A to I are UniProt Q59166, chain J is Q9RMB5.
    for (const chain of before.chains) {
      const row = chain.authorId === 'J' ? 'ATPE1_ACEWO_4BEM' : 'ATPE2_ACEWO_4BEM';
      expect(chain).toMatchObject({
        proteinId: stage.protein(row).id,
        organism: row,
        status: 'proposed',
        readiness: 'ready',
        identity: 1,
        coverage: 1,
      });
      expect(chain.candidates.length).toBeGreaterThan(1);
      expect(chain.candidates[0]?.proteinId).toBe(chain.proteinId);
    }
    const confirmed = await lead.must(maps.confirmReady, { params });
    expect(confirmed).toHaveLength(10);
    expect(confirmed.every((chain) => chain.status === 'confirmed' && chain.decidedBy?.id === lead.id)).toBe(
      true,
    );
    expect((await lead.must(structures.list, { params: { projectId } }))[0]).toMatchObject({ waiting: 0 });
    const now = await lead.must(uploads.read, { params: { projectId, uploadId: upload.id } });
    expect(now.state).toBe('done');
    const kinds = (await eventsOf(lead, projectId)).map((event) => event.kind);
    expect(kinds.filter((kind) => kind === 'map.decided')).toHaveLength(10);
    expect(kinds.slice(-2)).toEqual(['structure.changed', 'upload.changed']);
  });
});

describe('the head of 1COW with the alignment of γ subunits', () => {
  it('has one chain that is a protein of the family; the others say that nothing is near', async () => {
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const family = (await lead.must(families.list, { params: { projectId } })).find(
      ({ name }) => name === 'γ',
    );
    await lead.uploadFixture(
      projectId,
      { kind: 'alignment', familyId: family?.id ?? '' },
      'alignments/gamma_small_mafft.afa',
    );
    const upload = await lead.uploadFixture(projectId, { kind: 'structure' }, 'structures/1cow.pdb');
    expect(upload.state).toBe('waiting');
    const { chains } = await lead.must(structures.read, {
      params: { projectId, structureId: upload.structureId ?? '' },
    });
    expect(chains.map((chain) => chain.authorId)).toEqual(['A', 'B', 'C', 'D', 'E', 'F', 'G']);
    const gamma = chains.find((chain) => chain.authorId === 'G');
    expect(gamma?.organism).toMatch(/BOVIN/);
    expect(gamma?.segments.length).toBeGreaterThan(1);
    for (const chain of chains.filter((one) => one.authorId !== 'G')) {
      expect(chain).toMatchObject({ proteinId: null, familyId: null, readiness: 'choose', segments: [] });
      expect(chain.reason).toMatch(/No protein is near/);
    }
  });

  // Source: tests/fixtures/expected/mapping.json, computed with Biopython 1.80.
  it('lays chain G of 1COW on the columns that an outside alignment gives', async () => {
    const { jobs } = readFixtureJson<{ jobs: OutsideMapping[] }>('expected/mapping.json');
    const outside = jobs.find((job) => job.structure === '1cow.pdb' && job.chain === 'G');
    if (!outside) throw new Error('The reference answer is missing.');
    const lead = await signUp(server);
    const { id: projectId } = await makeProject(lead);
    const family = (await lead.must(families.list, { params: { projectId } })).find(
      ({ name }) => name === 'γ',
    );
    const { alignmentId } = await lead.uploadFixture(
      projectId,
      { kind: 'alignment', familyId: family?.id ?? '' },
      'alignments/gamma_small_mafft.afa',
    );
    const { structureId } = await lead.uploadFixture(projectId, { kind: 'structure' }, 'structures/1cow.pdb');
    const { chains } = await lead.must(structures.read, {
      params: { projectId, structureId: structureId ?? '' },
    });
    const gamma = chains.find((chain) => chain.authorId === 'G');
    const { rows } = await lead.must(alignments.read, {
      params: { projectId, alignmentId: alignmentId ?? '' },
    });
    const row = rows.find((one) => one.proteinId === gamma?.proteinId);
    expect(row?.name).toBe(outside.row);
    const columns = [...(row?.text ?? '')].flatMap((letter, at) => (letter === '-' ? [] : [at + 1]));
    const labels = await server.container.source.manager.findBy(ChainLabel, {
      chainId: gamma?.chainId ?? '',
    });
    const labelAt = (index: number): string => {
      const run = labels.find(({ chainIndex, length }) => index >= chainIndex && index < chainIndex + length);
      return run ? `${run.firstNumber + index - run.chainIndex}${run.suffix}` : '';
    };
    const pairs = (gamma?.segments ?? []).flatMap(({ chainStart, proteinStart, length }) =>
      Array.from({ length }, (_, k) => [labelAt(chainStart + k), columns[proteinStart + k]]),
    );
    expect(pairs).toEqual(outside.mapping.map(([label, , column]) => [label, column]));
  });
});
