import { subjectKey, type Subject } from '@/shared/contracts';

/** Every address of the product, built here and nowhere else. */
const project = (projectId: string) => `/projects/${projectId}`;
const withQuery = (path: string, query: Record<string, string | number | null | undefined>) => {
  const pairs = Object.entries(query).filter(([, value]) => value !== undefined && value !== null);
  const text = new URLSearchParams(
    pairs.map(([name, value]): [string, string] => [name, String(value)]),
  ).toString();
  return text ? `${path}?${text}` : path;
};

export const signInPath = (back?: string) => withQuery('/sign-in', { back });
export const signUpPath = (back?: string) => withQuery('/sign-up', { back });
export const projectsPath = () => '/projects';
export const newProjectPath = () => '/projects/new';
export const findPath = (projectId: string) => project(projectId);
export const locatePath = (projectId: string, text?: string) =>
  withQuery(`${project(projectId)}/locate`, { text });
export const peoplePath = (projectId: string) => `${project(projectId)}/people`;
export const historyPath = (projectId: string) => `${project(projectId)}/history`;
export const settingsPath = (projectId: string) => `${project(projectId)}/settings`;
export const familyPath = (projectId: string, familyId: string) =>
  `${project(projectId)}/families/${familyId}`;
export const proteinPath = (projectId: string, proteinId: string) =>
  `${project(projectId)}/proteins/${proteinId}`;
export const newUploadPath = (projectId: string, kind: 'alignment' | 'structure', familyId?: string) =>
  withQuery(`${project(projectId)}/upload`, { kind, familyId });
export const uploadPath = (projectId: string, uploadId: string) =>
  `${project(projectId)}/uploads/${uploadId}`;
export const alignmentPath = (projectId: string, alignmentId: string) =>
  `${project(projectId)}/alignments/${alignmentId}`;
/** `chain`: author id of the chain that is open. */
export const structurePath = (projectId: string, structureId: string, chain?: string) =>
  withQuery(`${project(projectId)}/structures/${structureId}`, { chain });
/** `becomes`: the letter of a change that was typed, offered there to be planned. */
export const residuePath = (
  projectId: string,
  residue: { proteinId: string; residueIndex: number },
  becomes?: string | null,
) => withQuery(`${project(projectId)}/residues/${residue.proteinId}/${residue.residueIndex}`, { becomes });
export const threadsPath = (projectId: string) => `${project(projectId)}/threads`;
export const threadPath = (projectId: string, subject: Subject) =>
  `${threadsPath(projectId)}/${subjectKey(subject)}`;
export const planPath = (projectId: string) => `${project(projectId)}/plan`;
export const newConstructPath = (projectId: string, proteinId?: string) =>
  withQuery(`${planPath(projectId)}/constructs/new`, { proteinId });
export const constructPath = (projectId: string, constructId: string) =>
  `${planPath(projectId)}/constructs/${constructId}`;
export const newMutantPath = (
  projectId: string,
  from: { proteinId?: string; residueIndex?: number; constructId?: string; changes?: string } = {},
) => withQuery(`${planPath(projectId)}/new`, from);
export const mutantPath = (projectId: string, mutantId: string) => `${planPath(projectId)}/${mutantId}`;
