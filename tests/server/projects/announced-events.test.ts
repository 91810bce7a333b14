import { randomUUID } from 'node:crypto';
import { applyToAlignment, applyToAlignments } from '@/features/alignments/apply-alignment-event';
import {
  applyToAnnotationsAtResidue,
  applyToAnnotationVersions,
} from '@/features/annotations/apply-annotation-event';
import { applyToFamilies, applyToProtein, applyToProteins } from '@/features/families/apply-family-event';
import { applyToConstructs, applyToMutant, applyToMutants } from '@/features/plans/apply-plan-event';
import { applyToMembers, applyToOwnProject } from '@/features/projects/apply-project-event';
import { applyToPassport } from '@/features/residues/apply-residue-event';
import { applyToStructure, applyToStructures } from '@/features/structures/apply-structure-event';
import { applyToThreadOfSubject, applyToThreadPages } from '@/features/threads/apply-thread-event';
import { applyToUpload, applyToUploads } from '@/features/uploads/apply-upload-event';
import {
  alignments,
  annotations,
  eventKinds,
  families,
  maps,
  plans,
  projects,
  residues,
  structures,
  subjectKey,
  threads,
  uploads,
  type ResidueRef,
} from '@/shared/contracts';

import { addMember, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { codingRecord, pinAt, stageAlignment, stageStructure, type Stage } from '@/tests/support/stage';
import { heldView, verifyAnnouncement, type HeldView } from '@/tests/support/verify-announcement';

let server: TestServer;
let stage: Stage;
let lead: TestPerson;
/** The residue of another protein that stands in the same column. */
let elsewhere: ResidueRef;

beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  lead = stage.lead;
  const here = { proteinId: stage.protein('ATPE_ECOLI').id, residueIndex };
  const { equivalents } = await lead.must(residues.passport, {
    params: { projectId: stage.projectId, ...here },
  });
  const found = equivalents.find(({ proteinId }) => proteinId === stage.protein('ATPE_VIBCH').id);
  elsewhere = { proteinId: found?.proteinId ?? '', residueIndex: found?.residueIndex ?? -1 };
}, 60_000);
afterAll(() => server.close());

/** The membrane carboxylate of the c subunit of E. coli, D61: 60 from 0. */
const residueIndex = 60;

/** What the screens of a project hold at one residue. */
function screens(more: HeldView[] = []): HeldView[] {
  const { projectId, familyId, alignmentId } = stage;
  const here = { proteinId: stage.protein('ATPE_ECOLI').id, residueIndex };
  const key = subjectKey({ kind: 'residue', ...here });
  const project = { params: { projectId } };
  return [
    heldView({
      name: 'project',
      // The number of the last event is the stream's to know.
      read: async () => ({ ...(await lead.must(projects.read, project)), head: 0 }),
      apply: (own, fact) => applyToOwnProject(own, fact, lead.id),
    }),
    heldView({ name: 'members', read: () => lead.must(projects.members, project), apply: applyToMembers }),
    heldView({ name: 'families', read: () => lead.must(families.list, project), apply: applyToFamilies }),
    heldView({
      name: 'proteins',
      read: () => lead.must(families.proteins, { params: { projectId, familyId } }),
      apply: (list, fact) => applyToProteins(list, fact, familyId),
    }),
    heldView({
      name: 'protein',
      read: () => lead.must(families.protein, { params: { projectId, proteinId: here.proteinId } }),
      apply: applyToProtein,
    }),
    heldView({ name: 'uploads', read: () => lead.must(uploads.list, project), apply: applyToUploads }),
    heldView({
      name: 'upload',
      read: () => lead.must(uploads.read, { params: { projectId, uploadId: stage.alignmentUpload.id } }),
      apply: applyToUpload,
    }),
    heldView({
      name: 'alignments',
      read: () => lead.must(alignments.list, project),
      apply: applyToAlignments,
    }),
    heldView({
      name: 'alignment',
      read: () => lead.must(alignments.read, { params: { projectId, alignmentId } }),
      apply: applyToAlignment,
    }),
    heldView({
      name: 'structures',
      read: () => lead.must(structures.list, project),
      apply: applyToStructures,
    }),
    heldView({
      name: 'passport',
      read: () => lead.must(residues.passport, { params: { projectId, ...here } }),
      apply: applyToPassport,
    }),
    ...[here, elsewhere].map((ref, at) =>
      heldView({
        name: at === 0 ? 'annotations here' : 'annotations elsewhere',
        read: () => lead.must(annotations.atResidue, { params: { projectId, ...ref } }),
        apply: (list, fact) => applyToAnnotationsAtResidue(list, fact, ref),
      }),
    ),
    heldView({
      name: 'thread',
      read: () => lead.must(threads.ofSubject, { params: { projectId, subjectKey: key } }),
      apply: (view, fact) => applyToThreadOfSubject(view, fact, key),
    }),
    heldView({
      name: 'threads',
      read: async () => [await lead.must(threads.list, project)],
      apply: applyToThreadPages,
    }),
    heldView({
      name: 'constructs',
      read: () => lead.must(plans.constructs, project),
      apply: applyToConstructs,
    }),
    heldView({
      name: 'mutants',
      read: () => lead.must(plans.mutants, project),
      apply: (list, fact) => applyToMutants(list, fact),
    }),
    heldView({
      name: 'mutants here',
      read: () => lead.must(plans.mutants, { ...project, query: here }),
      apply: (list, fact) => applyToMutants(list, fact, here),
    }),
    ...more,
  ];
}

const announced = new Set<string>();
async function verify<Result>(act: () => Promise<Result>, more: HeldView[] = []) {
  const announcement = await verifyAnnouncement(lead, stage.projectId, act, screens(more));
  for (const { kind } of announcement.events) announced.add(kind);
  return announcement;
}

describe('what an act announces, taken into what was read before, is what is read afterwards', () => {
  test('settings and members', async () => {
    const { projectId } = stage;
    const params = { projectId };
    const { version } = await lead.must(projects.read, { params });
    const settings = await verify(() =>
      lead.must(projects.change, { params, version, body: { name: 'Ring', readersMayComment: true } }),
    );
    expect(settings.patched).toEqual(['project']);
    const added = await verify(() => addMember(lead, projectId, 'reader'));
    expect(added.patched).toEqual(['members']);
    const personId = added.result.id;
    const raised = await verify(() =>
      lead.must(projects.changeMember, { params: { projectId, personId }, body: { role: 'curator' } }),
    );
    expect(raised.patched).toEqual(['members']);
    const removed = await verify(() => lead.must(projects.removeMember, { params: { projectId, personId } }));
    expect(removed.patched).toEqual(['members']);
    expect(removed.readAgain).toEqual([]);
  });

  test('an annotation made, edited, accepted and contested', async () => {
    const { projectId } = stage;
    const made = await verify(() => pinAt(stage, 'ATPE_ECOLI', residueIndex)(lead));
    expect(made.patched).toEqual(['annotations here']);
    expect(made.readAgain).toEqual(['annotations elsewhere', 'passport']);
    const params = { projectId, annotationId: made.result.id };
    const versions = heldView({
      name: 'versions',
      read: () => lead.must(annotations.versions, { params }),
      apply: (list, fact) => applyToAnnotationVersions(list, fact, params.annotationId),
    });
    const { kind, confidence, evidence } = made.result;
    const body = { kind, confidence, evidence, text: 'Carries the proton.' };
    const edited = await verify(
      () => lead.must(annotations.edit, { params, version: made.result.version, body }),
      [versions],
    );
    expect(edited.patched).toEqual(['annotations elsewhere', 'annotations here', 'versions']);
    const accepted = await verify(
      () =>
        lead.must(annotations.setStatus, {
          params,
          version: edited.result.version,
          body: { status: 'accepted', reason: '' },
        }),
      [versions],
    );
    expect(accepted.patched).toEqual(['annotations elsewhere', 'annotations here']);
    const contested = await verify(() =>
      lead.must(annotations.setStatus, {
        params,
        version: accepted.result.version,
        body: { status: 'contested', reason: 'The label is another.' },
      }),
    );
    expect(contested.patched).toEqual(['annotations elsewhere', 'annotations here']);
  });

  test('messages', async () => {
    const { projectId } = stage;
    const subject = { kind: 'residue' as const, proteinId: stage.protein('ATPE_ECOLI').id, residueIndex };
    const post = (text: string) => () =>
      lead.must(threads.post, { params: { projectId }, body: { clientKey: randomUUID(), subject, text } });
    for (const text of ['Which copy?', 'All of them.']) {
      const posted = await verify(post(text));
      expect(posted.patched).toEqual(['thread', 'threads']);
      expect(posted.readAgain).toEqual([]);
    }
    const other = { ...subject, residueIndex: 3 };
    const apart = await verify(() =>
      lead.must(threads.post, {
        params: { projectId },
        body: { clientKey: randomUUID(), subject: other, text: 'And here?' },
      }),
    );
    expect(apart.patched).toEqual(['threads']);
  });

  test('a family, an organism and a numbering', async () => {
    const { projectId } = stage;
    const made = await verify(() =>
      lead.must(families.make, {
        params: { projectId },
        body: { name: 'zeta', aliases: [], part: 'other', catalytic: false },
      }),
    );
    expect(made.patched).toEqual(['families']);
    const proteinId = stage.protein('ATPE_ECOLI').id;
    const params = { projectId, proteinId };
    const version = async () => (await lead.must(families.protein, { params })).version;
    const first = await version();
    const renamed = await verify(() =>
      lead.must(families.renameProtein, {
        params,
        version: first,
        body: { organism: 'Escherichia coli K-12' },
      }),
    );
    expect(renamed.patched).toEqual(['protein', 'proteins']);
    expect(renamed.readAgain).toEqual(expect.arrayContaining(['alignment', 'passport', 'thread', 'threads']));
    const second = await version();
    const numbered = await verify(() =>
      lead.must(families.setOffsetNumbering, {
        params,
        version: second,
        body: { name: 'older papers', offset: 10, skipZero: false, preferred: true },
      }),
    );
    expect(numbered.readAgain).toEqual(expect.arrayContaining(['annotations here', 'passport', 'protein']));
  });

  test('a second alignment of the family', async () => {
    const { projectId, familyId } = stage;
    const uploaded = await verify(() =>
      lead.uploadFixture(projectId, { kind: 'alignment', familyId }, 'alignments/c_small_mafft.afa'),
    );
    expect(uploaded.result.state).toBe('done');
    expect(uploaded.patched).toEqual(expect.arrayContaining(['alignments', 'uploads']));
  });

  test('a structure, then its chains one by one and all that are ready', async () => {
    const { projectId } = stage;
    const uploaded = await verify(() => stageStructure(stage, 'structures/4bem.pdb', false));
    expect(uploaded.patched).toEqual(expect.arrayContaining(['structures', 'uploads']));
    const params = { projectId, structureId: uploaded.result.structureId };
    const whole = heldView({
      name: 'structure',
      read: () => lead.must(structures.read, { params }),
      apply: applyToStructure,
    });
    const { chains } = await lead.must(structures.read, { params });
    const first = chains.find((chain) => chain.status === 'proposed');
    const decided = await verify(
      () =>
        lead.must(maps.decide, {
          params: { projectId, chainId: first?.chainId ?? '' },
          version: first?.version,
          body: { decision: 'leave out' },
        }),
      [whole],
    );
    expect(decided.patched).toEqual(expect.arrayContaining(['structure', 'structures']));
    const confirmed = await verify(() => lead.must(maps.confirmReady, { params }), [whole]);
    expect(confirmed.result.length).toBeGreaterThan(0);
    expect(confirmed.patched).toEqual(expect.arrayContaining(['structure', 'structures']));
  }, 60_000);

  test('a construct, a mutant and its primers', async () => {
    const { projectId } = stage;
    const proteinId = stage.protein('ATPE_VIBCH').id;
    const body = {
      name: 'pV1',
      dna: codingRecord('VIBCH_atpE'),
      codingStart: 1,
      circular: true,
      geneticCode: 11,
      proteinId,
    };
    const built = await verify(() => lead.must(plans.makeConstruct, { params: { projectId }, body }));
    expect(built.patched).toEqual(['constructs']);
    const { residues: letters } = await lead.must(families.protein, { params: { projectId, proteinId } });
    const planned = await verify(() =>
      lead.must(plans.makeMutant, {
        params: { projectId },
        body: { proteinId, changes: `${letters[40]}41A`, constructId: built.result.id, reason: '' },
      }),
    );
    expect(planned.patched).toEqual(['mutants']);
    const params = { projectId, mutantId: planned.result.id };
    const one = heldView({
      name: 'mutant',
      read: () => lead.must(plans.mutant, { params }),
      apply: applyToMutant,
    });
    const designed = await verify(
      () =>
        lead.must(plans.design, {
          params,
          version: planned.result.version,
          body: { constructId: built.result.id, host: 'ecoli' },
        }),
      [one],
    );
    expect(designed.patched).toEqual(['mutant', 'mutants']);
    const chosen = await verify(
      () =>
        lead.must(plans.choose, {
          params,
          version: designed.result.version,
          body: { designId: designed.result.designs.find(({ proved }) => proved)?.id ?? '' },
        }),
      [one],
    );
    expect(chosen.patched).toEqual(['mutant', 'mutants']);
  });

  test('no kind of event was left out', () => {
    expect([...announced].sort()).toEqual(Object.keys(eventKinds).sort());
  });
});
