import { audit, families, maps, projects, structures, uploads, type ChainMap } from '@/shared/contracts';
import { addMember } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';
import { stageAlignment, stageStructure, type Stage } from '../../support/stage';

jest.setTimeout(60_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

/** The head of 1COW beside c subunits alone: every chain waits for a person. */
async function stageHead() {
  const stage = await stageAlignment(server);
  const { structureId, upload } = await stageStructure(stage, 'structures/1cow.pdb', false);
  const params = { projectId: stage.projectId, structureId };
  const chain = async (authorId: string): Promise<ChainMap> => {
    const { chains } = await stage.lead.must(structures.read, { params });
    const found = chains.find((one) => one.authorId === authorId);
    if (!found) throw new Error(`No chain ${authorId}.`);
    return found;
  };
  return { ...stage, params, upload, chain };
}

const mapParams = ({ projectId }: Stage, { chainId }: ChainMap) => ({ projectId, chainId });

describe('deciding what a chain is', () => {
  it('adds it as a new protein, to which it is then mapped residue by residue', async () => {
    const stage = await stageHead();
    const beta = (await stage.lead.must(families.list, { params: { projectId: stage.projectId } })).find(
      ({ name }) => name === 'β',
    );
    const chain = await stage.chain('D');
    const decided = await stage.lead.must(maps.decide, {
      params: mapParams(stage, chain),
      version: chain.version,
      body: { decision: 'add protein', familyId: beta?.id ?? '', organism: 'Bos taurus' },
    });
    expect(decided).toMatchObject({
      status: 'confirmed',
      familyId: beta?.id,
      organism: 'Bos taurus',
      identity: 1,
      coverage: 1,
      proteinLength: chain.declaredLength,
      decidedBy: { id: stage.lead.id },
    });
    const paired = decided.segments.reduce((sum, segment) => sum + segment.length, 0);
    expect(paired).toBe(chain.observedLength);
    // The declared sequence is the protein, so residues without coordinates have a place in it too.
    expect(decided.proteinLength).toBe(chain.observedLength + chain.missingCount);
    const [protein] = await stage.lead.must(families.proteins, {
      params: { projectId: stage.projectId, familyId: beta?.id ?? '' },
    });
    expect(protein).toMatchObject({ organism: 'Bos taurus', id: decided.proteinId, name: '1cow chain D' });
  });

  it('lays it on the protein a person names, with every difference told', async () => {
    const stage = await stageAlignment(server);
    const { chainIds } = await stageStructure(stage, 'structures/4bem.pdb', false);
    const chainId = chainIds.get('A') ?? '';
    const target = stage.protein('ATPE1_ACEWO_4BEM');
    const decided = await stage.lead.must(maps.decide, {
      params: { projectId: stage.projectId, chainId },
      version: 1,
      body: { decision: 'correct', proteinId: target.id },
    });
    expect(decided).toMatchObject({ status: 'corrected', proteinId: target.id });
    expect(decided.identity).toBeLessThan(0.95);
    expect(decided.exceptions.filter((one) => one.kind === 'mismatch').length).toBeGreaterThan(10);
    expect(decided.reason).toMatch(/^Chosen by hand, ATPE1_ACEWO_4BEM: /);
    const { entries } = await stage.lead.must(audit.list, {
      params: { projectId: stage.projectId },
      query: { subjectKind: 'chain', subjectId: chainId },
    });
    expect(entries[0]).toMatchObject({
      action: 'map.corrected',
      before: { status: 'proposed', proteinId: stage.protein('ATPE2_ACEWO_4BEM').id },
      after: { status: 'corrected', proteinId: target.id },
    });
  });

  it('leaves it out, and takes that back as it was', async () => {
    const stage = await stageAlignment(server);
    const { structureId } = await stageStructure(stage, 'structures/4bem.pdb', false);
    const params = { projectId: stage.projectId, structureId };
    const { chains } = await stage.lead.must(structures.read, { params });
    const before = chains[2];
    if (!before) throw new Error('No third chain.');
    const left = await stage.lead.must(maps.decide, {
      params: mapParams(stage, before),
      version: before.version,
      body: { decision: 'leave out' },
    });
    expect(left).toMatchObject({ status: 'left out', segments: [] });
    const back = await stage.lead.must(maps.decide, {
      params: mapParams(stage, before),
      version: left.version,
      body: { decision: 'confirm' },
    });
    expect(back).toMatchObject({
      status: 'confirmed',
      proteinId: before.proteinId,
      segments: before.segments,
      // The modified residues and what the file says of them are known without reading it again.
      exceptions: before.exceptions,
      identity: before.identity,
    });
  });

  it('has the upload done with the last chain, in the same unit', async () => {
    const stage = await stageHead();
    const { lead, projectId } = stage;
    const read = () => lead.must(uploads.read, { params: { projectId, uploadId: stage.upload.id } });
    for (const authorId of ['A', 'B', 'C', 'D', 'E', 'F', 'G']) {
      expect((await read()).state).toBe('waiting');
      const chain = await stage.chain(authorId);
      await lead.must(maps.decide, {
        params: mapParams(stage, chain),
        version: chain.version,
        body: { decision: 'leave out' },
      });
    }
    expect((await read()).state).toBe('done');
    const { events } = await lead.must(projects.events, { params: { projectId }, query: { after: 0 } });
    expect(events.slice(-3).map((event) => event.kind)).toEqual([
      'map.decided',
      'structure.changed',
      'upload.changed',
    ]);
    expect(events.at(-2)?.payload).toMatchObject({ waiting: 0 });
    // Thinking better of it does not call the upload back.
    const chain = await stage.chain('D');
    const beta = (await lead.must(families.list, { params: { projectId } })).find(({ name }) => name === 'β');
    await lead.must(maps.decide, {
      params: mapParams(stage, chain),
      version: chain.version,
      body: { decision: 'add protein', familyId: beta?.id ?? '', organism: 'Bos taurus' },
    });
    expect((await read()).state).toBe('done');
  });
});

describe('a decision is refused', () => {
  it('when nothing is proposed, when it is not on what stands there now, and when the protein is elsewhere', async () => {
    const stage = await stageHead();
    const chain = await stage.chain('A');
    const params = mapParams(stage, chain);
    const confirm = await stage.lead.ask(maps.decide, {
      params,
      version: chain.version,
      body: { decision: 'confirm' },
    });
    expect([confirm.status, confirm.body.code]).toEqual([422, 'nothing-proposed']);
    const stale = await stage.lead.ask(maps.decide, {
      params,
      version: chain.version + 1,
      body: { decision: 'leave out' },
    });
    expect([stale.status, stale.body.code]).toEqual([412, 'stale-version']);
    expect(stale.body.current).toMatchObject({ chainId: chain.chainId, version: chain.version });
    const missing = await stage.lead.ask(maps.decide, { params, body: { decision: 'leave out' } });
    expect(missing.status).toBe(428);
    const other = await stageAlignment(server);
    const foreign = await stage.lead.ask(maps.decide, {
      params,
      version: chain.version,
      body: { decision: 'correct', proteinId: other.protein('ATPE_ECOLI').id },
    });
    expect(foreign.status).toBe(404);
    expect(await stage.chain('A')).toEqual(chain);
  });

  it('to those who are not curators, and to strangers as if there were no chain', async () => {
    const stage = await stageAlignment(server);
    const { structureId, chainIds } = await stageStructure(stage, 'structures/4bem.pdb', false);
    const params = { projectId: stage.projectId, chainId: chainIds.get('A') ?? '' };
    const decision = { params, version: 1, body: { decision: 'leave out' } } as const;
    const contributor = await addMember(stage.lead, stage.projectId, 'contributor');
    expect((await contributor.ask(maps.decide, decision)).status).toBe(403);
    const ready = { params: { projectId: stage.projectId, structureId } };
    expect((await contributor.ask(maps.confirmReady, ready)).status).toBe(403);
    const stranger = (await stageAlignment(server)).lead;
    expect((await stranger.ask(maps.decide, decision)).status).toBe(404);
    const curator = await addMember(stage.lead, stage.projectId, 'curator');
    expect((await curator.ask(maps.decide, decision)).status).toBe(200);
  });

  it('for chains that are no proteins', async () => {
    const stage = await stageAlignment(server);
    const upload = await stage.lead.uploadFixture(
      stage.projectId,
      { kind: 'structure' },
      'structures/1LCD.pdb',
    );
    const { chains } = await stage.lead.must(structures.read, {
      params: { projectId: stage.projectId, structureId: upload.structureId ?? '' },
    });
    const dna = chains.find((chain) => chain.kind === 'nucleic');
    if (!dna) throw new Error('1LCD holds DNA.');
    expect(dna).toMatchObject({ status: null, readiness: 'none', reason: 'DNA or RNA, not a protein.' });
    const answer = await stage.lead.ask(maps.decide, {
      params: mapParams(stage, dna),
      version: dna.version,
      body: { decision: 'leave out' },
    });
    expect([answer.status, answer.body.code]).toEqual([422, 'not-a-protein']);
  });
});
