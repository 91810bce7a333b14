import type { ResidueLabel, Subject } from '../../../shared/contracts';
import { notFound } from '../../lib/problem';

export interface ResolvedSubject {
  /** How the subject is called on screens. */
  caption: string;
  /** The residue it hangs on, for the plate; null for a structure. */
  residue: ResidueLabel | null;
}

/** Given several ids of one project, what each is called; an id that is not of the project is left out. */
export type SubjectResolver = (
  projectId: string,
  subjects: readonly Subject[],
) => Promise<(ResolvedSubject | null)[]>;

/** What a thread can hang on; each module that owns such things hands in how they are called. */
export class SubjectDirectory {
  constructor(private readonly resolvers: Record<Subject['kind'], SubjectResolver>) {}

  /** In the order given; one call a kind, whatever the number. */
  async resolve(projectId: string, subjects: readonly Subject[]): Promise<(ResolvedSubject | null)[]> {
    const resolved = new Map<Subject, ResolvedSubject | null>();
    for (const kind of new Set(subjects.map((subject) => subject.kind))) {
      const ofKind = subjects.filter((subject) => subject.kind === kind);
      const answers = await this.resolvers[kind](projectId, ofKind);
      ofKind.forEach((subject, at) => resolved.set(subject, answers[at] ?? null));
    }
    return subjects.map((subject) => resolved.get(subject) ?? null);
  }

  async mustResolve(projectId: string, subject: Subject): Promise<ResolvedSubject> {
    const [resolved] = await this.resolve(projectId, [subject]);
    if (!resolved) throw notFound(subject.kind);
    return resolved;
  }
}
