import type {
  Alignment,
  Annotation,
  ChainMap,
  Family,
  Message,
  Mutant,
  Protein,
  ResidueLabel,
  Structure,
  Thread,
  Upload,
} from '@/shared/contracts';

/** An id that sorts by its number. */
export const idOf = (number: number): string => `01900000-0000-7000-8000-${String(number).padStart(12, '0')}`;

const at = '2026-01-01T00:00:00.000Z';
const by = { id: idOf(900), name: 'Ines Halloran' };

export const label = (more: Partial<ResidueLabel> = {}): ResidueLabel => ({
  proteinId: idOf(1),
  residueIndex: 58,
  familyId: idOf(2),
  family: 'c',
  part: 'rotor',
  organism: 'Aquatilis marna',
  letter: 'E',
  label: '59',
  numbering: 'sequence',
  ...more,
});

export const upload = (more: Partial<Upload> = {}): Upload => ({
  id: idOf(10),
  kind: 'alignment',
  fileName: 'c.afa',
  bytes: 100,
  familyId: idOf(2),
  state: 'reading',
  stage: 'Reading rows',
  done: 1,
  total: 8,
  issues: [],
  alignmentId: null,
  structureId: null,
  by,
  at,
  version: 1,
  ...more,
});

export const family = (more: Partial<Family> = {}): Family => ({
  id: idOf(2),
  name: 'c',
  aliases: [],
  description: 'ring of hairpins',
  part: 'rotor',
  catalytic: false,
  sort: 1,
  proteinCount: 1,
  referenceAlignmentId: null,
  version: 1,
  ...more,
});

export const protein = (more: Partial<Protein> = {}): Protein => ({
  id: idOf(1),
  familyId: idOf(2),
  organism: 'Aquatilis marna',
  name: 'c',
  length: 4,
  version: 1,
  residues: 'MEGL',
  numberings: [],
  preferredNumbering: 'sequence',
  ...more,
});

export const alignment = (more: Partial<Alignment> = {}): Alignment => ({
  id: idOf(20),
  familyId: idOf(2),
  name: 'c',
  isReference: true,
  revisionId: idOf(21),
  revision: 1,
  format: 'fasta',
  rowCount: 8,
  columnCount: 90,
  fileName: 'c.afa',
  issues: [],
  by,
  at,
  version: 1,
  ...more,
});

export const structure = (more: Partial<Structure> = {}): Structure => ({
  id: idOf(30),
  name: 'ring',
  revisionId: idOf(31),
  revision: 1,
  format: 'pdb',
  title: '',
  modelCount: 1,
  chainCount: 2,
  atomCount: 100,
  waiting: 2,
  fileName: 'ring.pdb',
  issues: [],
  by,
  at,
  version: 1,
  ...more,
});

export const chainMap = (more: Partial<ChainMap> = {}): ChainMap => ({
  chainId: idOf(40),
  structureId: idOf(30),
  authorId: 'K',
  labelIds: [],
  kind: 'protein',
  observedLength: 4,
  declaredLength: null,
  sequenceKey: 'ACDE',
  missingCount: 0,
  firstLabel: '1',
  lastLabel: '4',
  status: 'proposed',
  readiness: 'ready',
  reason: '',
  familyId: idOf(2),
  proteinId: idOf(1),
  organism: 'Aquatilis marna',
  identity: 1,
  coverage: 1,
  proteinLength: 4,
  segments: [{ chainStart: 0, proteinStart: 0, length: 4 }],
  exceptions: [],
  candidates: [],
  decidedBy: null,
  version: 1,
  ...more,
});

export const annotation = (more: Partial<Annotation> = {}): Annotation => ({
  id: idOf(50),
  shape: 'point',
  status: 'proposed',
  statusReason: '',
  kind: 'ion site',
  text: 'Carries the ion.',
  confidence: 'high',
  evidence: [],
  pins: [{ ...label(), structureId: null, chains: null }],
  versionNumber: 1,
  by,
  at,
  changedBy: by,
  changedAt: at,
  version: 1,
  ...more,
});

export const message = (eventNumber: number, more: Partial<Message> = {}): Message => ({
  id: idOf(1000 + eventNumber),
  threadId: idOf(60),
  eventNumber,
  text: `message ${eventNumber}`,
  by,
  at,
  clientKey: idOf(5000 + eventNumber),
  ...more,
});

export const threadKey = `residue:${idOf(1)}:58`;
export const thread = (last: number, more: Partial<Thread> = {}): Thread => ({
  id: idOf(60),
  subject: { kind: 'residue', proteinId: idOf(1), residueIndex: 58 },
  subjectKey: threadKey,
  caption: 'c E59',
  residue: label(),
  messageCount: last,
  lastMessage: message(last),
  ...more,
});

export const mutant = (more: Partial<Mutant> = {}): Mutant => ({
  id: idOf(70),
  name: 'E59Q',
  constructId: null,
  constructName: null,
  state: 'planned',
  reason: '',
  mutations: [{ residue: label(), oldResidues: 'E', newResidues: 'Q' }],
  designs: [],
  by,
  at,
  version: 1,
  ...more,
});
