// Two projects that hold one of everything, and somebody in each role, for the table of who may do what.
import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import {
  plans,
  projects,
  threads,
  type Annotation,
  type Endpoint,
  type Mutant,
  type Construct,
} from '@/shared/contracts';
import { addMember, ask, signUp, type TestPerson } from './person';
import type { TestServer } from './server';
import {
  pinAt,
  stageAlignment,
  stageConstruct,
  stageStructure,
  type Stage,
  type StagedStructure,
} from './stage';

/** A project with one of everything in it. */
export interface Full {
  stage: Stage;
  projectId: string;
  structure: StagedStructure;
  chainId: string;
  annotation: Annotation;
  construct: Construct;
  /** Designed, so that it has designs to choose from. */
  mutant: Mutant;
}

export async function stageFull(server: TestServer, lead?: TestPerson): Promise<Full> {
  const stage = await stageAlignment(server, lead);
  const { projectId } = stage;
  const params = { projectId };
  const structure = await stageStructure(stage, 'structures/4bem.pdb', false);
  const annotation = await pinAt(stage, 'ATPE2_ACEWO_4BEM', 61)(stage.lead);
  const construct = await stageConstruct(stage);
  const planned = await stage.lead.must(plans.makeMutant, {
    params,
    body: {
      proteinId: stage.protein('ATPE_VIBCH').id,
      changes: 'D60Q',
      constructId: construct.id,
      reason: '',
    },
  });
  const mutant = await stage.lead.must(plans.design, {
    params: { projectId, mutantId: planned.id },
    version: planned.version,
    body: { constructId: construct.id, host: 'ecoli' },
  });
  const subject = { kind: 'residue' as const, proteinId: stage.protein('ATPE_ECOLI').id, residueIndex: 60 };
  await stage.lead.must(threads.post, {
    params,
    body: { clientKey: randomUUID(), subject, text: 'Is this it?' },
  });
  const chainId = structure.chainIds.get('A') ?? '';
  return { stage, projectId, structure, chainId, annotation, construct, mutant };
}

/** Somebody who asks; signed out there is no person. */
export interface Asker {
  token: string | null;
  person: TestPerson | null;
}

export const askerNames = ['signed out', 'outsider', 'reader', 'contributor', 'curator', 'lead'] as const;
export type AskerName = (typeof askerNames)[number];

/** The outsider leads another project that holds the same things. */
export async function stageAskers(full: Full, outsider: TestPerson): Promise<Record<AskerName, Asker>> {
  const { stage, projectId } = full;
  const [reader, contributor, curator] = await Promise.all(
    (['reader', 'contributor', 'curator'] as const).map((role) => addMember(stage.lead, projectId, role)),
  );
  const asker = (person: TestPerson | undefined): Asker => ({
    token: person?.token ?? null,
    person: person ?? null,
  });
  return {
    'signed out': asker(undefined),
    outsider: asker(outsider),
    reader: asker(reader),
    contributor: asker(contributor),
    curator: asker(curator),
    lead: asker(stage.lead),
  };
}

/** Sends the form of an upload, also without a token. */
export async function sendForm(origin: string, projectId: string, token: string | null, familyId: string) {
  const form = new FormData();
  form.append('kind', 'alignment');
  form.append('familyId', familyId);
  const file = path.join(__dirname, '../fixtures/alignments/c_small_mafft.afa');
  form.append('file', new Blob([await readFile(file)]), 'again.afa');
  const response = await fetch(`${origin}/api/v1/projects/${projectId}/uploads`, {
    method: 'POST',
    headers: token ? { authorization: `Bearer ${token}` } : {},
    body: form,
  });
  return { status: response.status, body: (await response.json()) as object };
}

/** Somebody the tests add to the project and take out of it. */
export async function stageTarget(full: Full): Promise<{
  email: string;
  personId: string;
  isMember(member: boolean): Promise<void>;
}> {
  const person = await signUp(full.stage.lead.server, 'The one added');
  const { lead, projectId } = full.stage;
  return {
    email: person.email,
    personId: person.id,
    async isMember(member) {
      const list = await lead.must(projects.members, { params: { projectId } });
      const is = list.some((one) => one.personId === person.id);
      if (member && !is) {
        const body = { email: person.email, role: 'reader' as const };
        await lead.must(projects.addMember, { params: { projectId }, body });
      }
      if (!member && is) {
        await lead.must(projects.removeMember, { params: { projectId, personId: person.id } });
      }
    },
  };
}

/** Asks with parameters that the type of the endpoint does not know here; the table pairs them by hand. */
export function askAny(origin: string, token: string | null, endpoint: Endpoint, input: object) {
  return ask(origin, token, endpoint, input);
}
