import { In, type EntityManager } from 'typeorm';
import type { Passport, ResidueLabel, ResidueRef } from '../../../shared/contracts';
import {
  labelOfResidue,
  type Numbering as CoreNumbering,
} from '../../../shared/sequence/numbering/numbering';
import { residueIndex as asResidueIndex } from '../../../shared/sequence/positions';
import type { UnitOfWork } from '../../db';
import { notFound, unusable } from '../../lib/problem';
import { Family } from './family.entity';
import { bornNumbering, preferredNumbering } from './family.presenter';
import { NumberingSegment } from './numbering-segment.entity';
import { Numbering } from './numbering.entity';
import { Protein } from './protein.entity';

/** What is needed to compare a sequence with a protein. */
export type ProteinText = Pick<Protein, 'id' | 'familyId' | 'organism' | 'residues'>;

export interface NumberedProtein {
  protein: Protein;
  family: Family;
  preferred: CoreNumbering;
}

/** What other modules may know of proteins. Whether the person may see the project is asked before. */
export class ProteinDirectory {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  find(projectId: string, proteinId: string): Promise<Protein | null> {
    return this.unitOfWork.reader.findOneBy(Protein, { id: proteinId, projectId });
  }

  async mustFind(projectId: string, proteinId: string): Promise<Protein> {
    const protein = await this.find(projectId, proteinId);
    if (!protein) throw notFound('protein');
    return protein;
  }

  /** A protein with its family and the numbering shown first, for reading what people type about it. */
  async numbered(proteinId: string): Promise<NumberedProtein> {
    const reader = this.unitOfWork.reader;
    const protein = await reader.findOneByOrFail(Protein, { id: proteinId });
    const [family, numberings] = await Promise.all([
      reader.findOneByOrFail(Family, { id: protein.familyId }),
      reader.findBy(Numbering, { proteinId }),
    ]);
    const name = preferredNumbering(
      family,
      numberings.map((numbering) => numbering.name),
    );
    const runs = await this.runs(numberings, reader);
    const preferred = numberings.find((numbering) => numbering.name === name);
    return { protein, family, preferred: runs.get(preferred?.id ?? '') ?? { segments: [] } };
  }

  async byIds(
    ids: readonly string[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<Map<string, Protein>> {
    const proteins = await manager.findBy(Protein, { id: In([...new Set(ids)]) });
    return new Map(proteins.map((protein) => [protein.id, protein]));
  }

  async familiesByIds(
    ids: readonly string[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<Map<string, Family>> {
    const families = await manager.findBy(Family, { id: In([...new Set(ids)]) });
    return new Map(families.map((family) => [family.id, family]));
  }

  /** Every protein of a project, with its family, in the order they were made. */
  ofProject(projectId: string): Promise<ProteinText[]> {
    return this.unitOfWork.reader.find(Protein, {
      select: { id: true, familyId: true, organism: true, residues: true },
      where: { projectId },
      order: { id: 'ASC' },
    });
  }

  /** Refuses references to proteins of other projects and to residues behind a protein's end. */
  async mustHoldResidues(projectId: string, refs: readonly ResidueRef[]): Promise<void> {
    const proteins = await this.byIds(refs.map((ref) => ref.proteinId));
    for (const ref of refs) {
      const protein = proteins.get(ref.proteinId);
      if (!protein || protein.projectId !== projectId) throw notFound('protein');
      if (ref.residueIndex >= protein.residues.length) {
        throw unusable(
          'no-such-residue',
          `The ${protein.organism} protein has ${protein.residues.length} residues; there is none at place ${ref.residueIndex + 1}.`,
        );
      }
    }
  }

  /** The residue's name in every numbering its protein has. */
  async labelsOfResidue(proteinId: string, residueIndex: number): Promise<Passport['labels']> {
    const reader = this.unitOfWork.reader;
    const protein = await reader.findOneByOrFail(Protein, { id: proteinId });
    const [family, numberings] = await Promise.all([
      reader.findOneByOrFail(Family, { id: protein.familyId }),
      reader.find(Numbering, { where: { proteinId }, order: { id: 'ASC' } }),
    ]);
    const runs = await this.runs(numberings, reader);
    const preferred = preferredNumbering(
      family,
      numberings.map((numbering) => numbering.name),
    );
    return numberings.map(({ id, name, kind }) => ({
      numbering: name,
      kind,
      preferred: name === preferred,
      label: labelOfResidue(runs.get(id) ?? { segments: [] }, asResidueIndex(residueIndex)),
    }));
  }

  /** One label for each reference, in the order given, in four queries however many there are. */
  async presentLabels(
    refs: readonly ResidueRef[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<ResidueLabel[]> {
    if (refs.length === 0) return [];
    const proteins = await this.byIds(
      refs.map((ref) => ref.proteinId),
      manager,
    );
    const families = await this.familiesByIds(
      [...proteins.values()].map((protein) => protein.familyId),
      manager,
    );
    const names = new Set([bornNumbering]);
    for (const family of families.values())
      if (family.preferredNumbering) names.add(family.preferredNumbering);
    const numberings = await manager.findBy(Numbering, {
      proteinId: In([...proteins.keys()]),
      name: In([...names]),
    });
    const runs = await this.runs(numberings, manager);
    const ofProtein = new Map<string, Numbering[]>();
    for (const one of numberings)
      ofProtein.set(one.proteinId, [...(ofProtein.get(one.proteinId) ?? []), one]);
    return refs.map((ref) => {
      const protein = proteins.get(ref.proteinId);
      const family = protein && families.get(protein.familyId);
      if (!protein || !family) throw new Error(`Protein ${ref.proteinId} is referred to but not there.`);
      const own = ofProtein.get(protein.id) ?? [];
      return presentLabel(protein, family, ref.residueIndex, own, runs);
    });
  }

  private async runs(
    numberings: readonly Numbering[],
    manager: EntityManager,
  ): Promise<Map<string, CoreNumbering>> {
    const rows = await manager.findBy(NumberingSegment, {
      numberingId: In(numberings.map((numbering) => numbering.id)),
    });
    const runs = new Map<string, { segments: CoreNumbering['segments'][number][] }>();
    for (const { numberingId, residueIndex, length, firstNumber, suffix } of rows) {
      const run = { residueIndex: asResidueIndex(residueIndex), length, firstNumber, suffix };
      const known = runs.get(numberingId);
      if (known) known.segments.push(run);
      else runs.set(numberingId, { segments: [run] });
    }
    return runs;
  }
}

/** A residue without a label in the preferred numbering is shown by the numbering its protein was born with. */
function presentLabel(
  protein: Protein,
  family: Family,
  residueIndex: number,
  numberings: readonly Numbering[],
  runs: ReadonlyMap<string, CoreNumbering>,
): ResidueLabel {
  const preferred = preferredNumbering(
    family,
    numberings.map((one) => one.name),
  );
  const labelIn = (name: string): string | null => {
    const numbering = numberings.find((one) => one.name === name);
    const run = numbering && runs.get(numbering.id);
    return run ? labelOfResidue(run, asResidueIndex(residueIndex)) : null;
  };
  const label = labelIn(preferred);
  return {
    proteinId: protein.id,
    residueIndex,
    familyId: family.id,
    family: family.name,
    part: family.part,
    organism: protein.organism,
    letter: protein.residues.charAt(residueIndex),
    label: label ?? labelIn(bornNumbering) ?? '',
    numbering: label === null ? bornNumbering : preferred,
  };
}
