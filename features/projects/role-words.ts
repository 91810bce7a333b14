import { can, rights, roles, type Act, type Role } from '@/shared/permissions';

/** What a role does, in a few words; each also does what those before it do. */
export function roleConsequence(role: Role, readersMayComment: boolean): string {
  const words: Record<Role, string> = {
    reader: readersMayComment
      ? 'Reads and exports; comments, because this project lets readers comment.'
      : 'Reads and exports, nothing else.',
    contributor: 'Annotates, comments, plans mutations.',
    curator: 'Uploads, confirms maps, accepts and retires annotations, too.',
    lead: 'Members and settings, too.',
  };
  return words[role];
}

/** The strongest first, as people look for themselves. */
export const rolesFromLead: readonly Role[] = [...roles].reverse();

export interface RightWords {
  act: Act;
  words: string;
  /** `own`: only what one made oneself. */
  answer: 'may' | 'own' | 'may not';
}

const actWords: Record<Act, string> = {
  'read project': 'residues, annotations, threads, structures, plans',
  export: 'lists and primers as files',
  comment: 'write in threads',
  annotate: 'pin annotations',
  'edit annotation': 'edit annotations',
  'contest annotation': 'contest an annotation, with a reason',
  'accept annotation': 'accept annotations',
  'retire annotation': 'retire annotations',
  plan: 'plan mutations, design primers',
  upload: 'upload alignments and coordinates',
  'confirm map': 'confirm which chain is which protein',
  'set numbering': 'set numberings',
  'edit family': 'add families, rename organisms',
  'manage members': 'add and remove people, change roles',
  'change settings': 'change the settings',
};

const groups: { title: string; acts: Act[] }[] = [
  { title: 'Read', acts: ['read project', 'export'] },
  { title: 'Say', acts: ['comment'] },
  {
    title: 'Keep',
    acts: ['annotate', 'edit annotation', 'contest annotation', 'accept annotation', 'retire annotation'],
  },
  { title: 'Bring', acts: ['upload', 'confirm map', 'set numbering', 'edit family'] },
  { title: 'Plan', acts: ['plan'] },
  { title: 'Run', acts: ['manage members', 'change settings'] },
];

/** The table of rights for one role, in groups and in words. */
export function rightsOf(role: Role, readersMayComment: boolean): { title: string; rights: RightWords[] }[] {
  const answer = (act: Act): RightWords['answer'] => {
    if (can(role, act, { readersMayComment })) return 'may';
    return can(role, act, { readersMayComment, own: true }) ? 'own' : 'may not';
  };
  return groups.map(({ title, acts }) => ({
    title,
    rights: acts.map((act) => ({ act, words: actWords[act], answer: answer(act) })),
  }));
}

/** Acts that no group lists; kept empty by a test. */
export const unlistedActs = (): string[] =>
  Object.keys(rights).filter((act) => !groups.some(({ acts }) => acts.some((one) => one === act)));
