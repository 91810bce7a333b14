// Every screen of the walk, as an address of the demo and words by which one knows that it is there.
import { alignments, auth, families, plans, projects, structures, teams, uploads } from '@/shared/contracts';
import {
  alignmentPath,
  constructPath,
  familyPath,
  findPath,
  locatePath,
  mutantPath,
  newConstructPath,
  newMutantPath,
  newProjectPath,
  newUploadPath,
  peoplePath,
  planPath,
  projectsPath,
  proteinPath,
  residuePath,
  settingsPath,
  signInPath,
  signUpPath,
  structurePath,
  threadPath,
  threadsPath,
  uploadPath,
} from '@/client/paths';
import { modelOrganism } from '@/shared/scenario/organisms.data';
import { people } from '@/shared/scenario/people.data';
import { mustAsk, TestPerson } from '@/tests/support/person';
import { demoPassword } from '@/tests/support/server-process';
import { addressOf } from './demo';

export interface Screen {
  name: string;
  path: string;
  /** Said on it once it is read. */
  says: RegExp;
  /** Seen before anybody is signed in. */
  isOutside?: boolean;
}

/** Somebody of the demo, through the API. */
export async function demoPerson(origin: string, role: string): Promise<TestPerson> {
  const email = people.find((person) => person.role === role)?.email ?? '';
  const { person, accessToken } = await mustAsk(origin, null, auth.signIn, {
    body: { email, password: demoPassword },
  });
  return new TestPerson({ origin }, person.id, email, accessToken);
}

/** The screens of the demo, with a refused file and a project that holds nothing yet made for them. */
export async function demoScreens(origin: string): Promise<Screen[]> {
  const lead = await demoPerson(origin, 'lead');
  const [demo] = await lead.must(projects.list);
  const projectId = demo?.id ?? '';
  const params = { projectId };
  const ring = (await lead.must(families.list, { params })).find(({ name }) => name === 'c');
  const familyId = ring?.id ?? '';
  const proteins = await lead.must(families.proteins, { params: { projectId, familyId } });
  const proteinId = proteins.find(({ organism }) => organism === modelOrganism)?.id ?? '';
  const alignment = (await lead.must(alignments.list, { params })).find((one) => one.familyId === familyId);
  const [structure] = await lead.must(structures.list, { params });
  const [construct] = await lead.must(plans.constructs, { params });
  const mutant = (await lead.must(plans.mutants, { params })).find(({ designs }) => designs.length > 0);
  const [stored] = await lead.must(uploads.list, { params });
  const refused = await lead.upload(
    projectId,
    { kind: 'alignment', familyId },
    'broken.afa',
    Buffer.from('>one\nMEN-LNMD\n>two\nMEN-LNM\n>three\nMEN7LNMD\n'),
  );
  await lead.settled(projectId, refused.body.id);
  const team = await lead.must(teams.make, { body: { name: 'A team that begins' } });
  const empty = await lead.must(projects.make, {
    body: { teamId: team.id, name: 'Nothing yet', motorKind: 'F' },
  });
  const address = addressOf('c', 'carboxylate');
  const residue = { proteinId, residueIndex: Number(address.replace(/\D/g, '')) - 1 };
  const subject = { kind: 'residue', ...residue } as const;
  return [
    { name: 'sign-in', path: signInPath(), says: /New here\?/, isOutside: true },
    { name: 'sign-up', path: signUpPath(), says: /You have an account\?/, isOutside: true },
    { name: 'projects', path: projectsPath(), says: /Ten-ring motor/ },
    { name: 'new-project', path: newProjectPath(), says: /Kind of motor/ },
    { name: 'start', path: findPath(empty.id), says: /Five steps/ },
    { name: 'find', path: findPath(projectId), says: /ring and stator model/ },
    { name: 'locate', path: locatePath(projectId, address.replace(/[A-Z]/, '')), says: /readings of/ },
    { name: 'family', path: familyPath(projectId, familyId), says: /Orvella tarda/ },
    { name: 'protein', path: proteinPath(projectId, proteinId), says: /Go to residue number/ },
    { name: 'upload', path: newUploadPath(projectId, 'alignment', familyId), says: /or drop it here/ },
    { name: 'upload-structure', path: newUploadPath(projectId, 'structure'), says: /or drop it here/ },
    { name: 'upload-stored', path: uploadPath(projectId, stored?.id ?? ''), says: /was read whole/ },
    { name: 'upload-refused', path: uploadPath(projectId, refused.body.id), says: /MEN-LNM$/m },
    { name: 'alignment', path: alignmentPath(projectId, alignment?.id ?? ''), says: /Nerivola profunda/ },
    { name: 'structure', path: structurePath(projectId, structure?.id ?? ''), says: /Decide again/ },
    { name: 'residue', path: residuePath(projectId, residue), says: /by equivalence, grade|Carries the ion/ },
    { name: 'threads', path: threadsPath(projectId), says: /messages/ },
    { name: 'thread', path: threadPath(projectId, subject), says: /The three pairs fit one row/ },
    { name: 'plan', path: planPath(projectId), says: /Export primers/ },
    { name: 'new-construct', path: newConstructPath(projectId, proteinId), says: /Paste the DNA/ },
    { name: 'construct', path: constructPath(projectId, construct?.id ?? ''), says: /Codons 1 to/ },
    {
      name: 'new-mutant',
      path: newMutantPath(projectId, { ...residue, changes: `${address.slice(1)}Q` }),
      says: /the protein has it there/,
    },
    { name: 'mutant', path: mutantPath(projectId, mutant?.id ?? ''), says: /Read back from the DNA/ },
    { name: 'people', path: peoplePath(projectId), says: /Livia Ostrey/ },
    { name: 'settings', path: settingsPath(projectId), says: /Readers may comment/ },
  ];
}
