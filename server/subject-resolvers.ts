import { In } from 'typeorm';
import type { ResidueRef, Subject } from '../shared/contracts';
import { plateLabel } from '../shared/sequence/address/label';
import type { UnitOfWork } from './db';
import { Annotation, type AnnotationQueries } from './modules/annotations';
import { Protein, type ProteinDirectory } from './modules/families';
import { Mutant, type PlanQueries } from './modules/plans';
import { Structure } from './modules/structures';
import type { SubjectResolver } from './modules/threads';

type Kind<K extends Subject['kind']> = Extract<Subject, { kind: K }>;

/** How each kind of subject is called; threads know no other module, so it is put together here. */
export function subjectResolvers(
  unitOfWork: UnitOfWork,
  proteins: ProteinDirectory,
  annotations: AnnotationQueries,
  plans: PlanQueries,
): Record<Subject['kind'], SubjectResolver> {
  const reader = unitOfWork.reader;
  return {
    residue: async (projectId, subjects) => {
      const refs = subjects as readonly Kind<'residue'>[];
      const known = await reader.findBy(Protein, { projectId, id: In(refs.map((ref) => ref.proteinId)) });
      const isThere = (ref: ResidueRef) =>
        known.some((one) => one.id === ref.proteinId && ref.residueIndex < one.residues.length);
      const there = refs.filter(isThere);
      const labels = await proteins.presentLabels(there);
      return refs.map((ref) => {
        const residue = labels[there.indexOf(ref)];
        return residue ? { caption: `${plateLabel(residue)}, ${residue.organism}`, residue } : null;
      });
    },
    annotation: async (projectId, subjects) => {
      const ids = (subjects as readonly Kind<'annotation'>[]).map((subject) => subject.id);
      const rows = await annotations.present(await reader.findBy(Annotation, { projectId, id: In(ids) }));
      return ids.map((id) => {
        const row = rows.find((one) => one.id === id);
        return row
          ? { caption: `${row.kind}: ${row.text.slice(0, 60)}`, residue: row.pins[0] ?? null }
          : null;
      });
    },
    mutant: async (projectId, subjects) => {
      const ids = (subjects as readonly Kind<'mutant'>[]).map((subject) => subject.id);
      const rows = await plans.presentMutants(await reader.findBy(Mutant, { projectId, id: In(ids) }));
      return ids.map((id) => {
        const row = rows.find((one) => one.id === id);
        return row ? { caption: row.name, residue: row.mutations[0]?.residue ?? null } : null;
      });
    },
    structure: async (projectId, subjects) => {
      const ids = (subjects as readonly Kind<'structure'>[]).map((subject) => subject.id);
      const rows = await reader.findBy(Structure, { projectId, id: In(ids) });
      return ids.map((id) => {
        const row = rows.find((one) => one.id === id);
        return row ? { caption: row.name, residue: null } : null;
      });
    },
  };
}
