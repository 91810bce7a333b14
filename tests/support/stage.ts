// A project on real files, as several tests need it: the ring of 4bem.pdb with the alignment of its c subunits.
import { readFileSync } from 'node:fs';
import path from 'node:path';
import {
  alignments,
  annotations,
  families,
  maps,
  plans,
  structures,
  type Annotation,
  type Construct,
  type OwnProject,
  type ProteinBrief,
  type Upload,
} from '@/shared/contracts';
import { makeProject, signUp, type TestPerson } from './person';
import type { TestServer } from './server';

/** Rows of c_small_mafft.afa, by the name of their organism in it. */
export type RowName =
  'ATPE_ECOLI' | 'ATPE_VIBCH' | 'ATP9_YEAST_3U32' | 'ATPE2_ACEWO_4BEM' | 'ATPE1_ACEWO_4BEM';

export interface Stage {
  lead: TestPerson;
  project: OwnProject;
  projectId: string;
  familyId: string;
  alignmentId: string;
  alignmentUpload: Upload;
  protein(row: RowName): ProteinBrief;
}

/** A project whose family c holds the rows of c_small_mafft.afa. */
export async function stageAlignment(server: TestServer, lead?: TestPerson): Promise<Stage> {
  const person = lead ?? (await signUp(server, 'The lead'));
  const project = await makeProject(person);
  const projectId = project.id;
  const list = await person.must(families.list, { params: { projectId } });
  const familyId = list.find((family) => family.name === 'c')?.id ?? '';
  const alignmentUpload = await person.uploadFixture(
    projectId,
    { kind: 'alignment', familyId },
    'alignments/c_small_mafft.afa',
  );
  const proteins = await person.must(families.proteins, { params: { projectId, familyId } });
  const [alignment] = await person.must(alignments.list, { params: { projectId } });
  return {
    lead: person,
    project,
    projectId,
    familyId,
    alignmentId: alignment?.id ?? '',
    alignmentUpload,
    protein(row) {
      const found = proteins.find((protein) => protein.name === row);
      if (!found) throw new Error(`No protein ${row}: ${proteins.map(({ name }) => name).join(', ')}`);
      return found;
    },
  };
}

export interface StagedStructure {
  upload: Upload;
  structureId: string;
  /** By author id. */
  chainIds: Map<string, string>;
}

export async function stageStructure(
  { lead, projectId }: Stage,
  fixture: string,
  confirm = true,
): Promise<StagedStructure> {
  const upload = await lead.uploadFixture(projectId, { kind: 'structure' }, fixture);
  const structureId = upload.structureId ?? '';
  const params = { projectId, structureId };
  if (confirm) await lead.must(maps.confirmReady, { params });
  const { chains } = await lead.must(structures.read, { params });
  return { upload, structureId, chainIds: new Map(chains.map((chain) => [chain.authorId, chain.chainId])) };
}

export function pinAt(stage: Stage, row: RowName, residueIndex: number, text = 'Carries the ion.') {
  return (by: TestPerson): Promise<Annotation> =>
    by.must(annotations.make, {
      params: { projectId: stage.projectId },
      body: {
        pins: [{ proteinId: stage.protein(row).id, residueIndex }],
        kind: 'ion site',
        text,
        confidence: 'high',
        evidence: [{ kind: 'coordinates', reference: 'PDB 4BEM' }],
      },
    });
}

/** One record of vcholerae_atp_cds.fasta, as FASTA. */
export function codingRecord(name: string): string {
  const text = readFileSync(path.join(__dirname, '../fixtures/dna/vcholerae_atp_cds.fasta'), 'utf8');
  const record = text.split(/^>/m).find((one) => one.startsWith(`${name} `));
  if (record === undefined) throw new Error(`No record ${name}.`);
  return `>${record}`;
}

export function codingBases(name: string): string {
  return codingRecord(name).split('\n').slice(1).join('').trim();
}

/** The coding sequence of the V. cholerae c subunit, as a construct of its protein. */
export function stageConstruct(stage: Stage, name = 'pVc-atpE'): Promise<Construct> {
  return stage.lead.must(plans.makeConstruct, {
    params: { projectId: stage.projectId },
    body: {
      name,
      dna: codingRecord('VIBCH_atpE'),
      codingStart: 1,
      circular: false,
      geneticCode: 11,
      proteinId: stage.protein('ATPE_VIBCH').id,
    },
  });
}
