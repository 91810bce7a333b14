import type { z } from 'zod';
import type { offsetNumberingBody, Protein as ProteinContract } from '../../../shared/contracts';
import { offsetNumbering } from '../../../shared/sequence/numbering/numbering';
import type { Unit, UnitOfWork } from '../../db';
import { isDuplicate } from '../../lib/database-errors';
import { insertMany } from '../../db/insert-many';
import { newId } from '../../lib/new-id';
import { conflict, stale } from '../../lib/problem';
import type { FamilyAccess } from './family.access';
import { Family } from './family.entity';
import { bornNumbering } from './family.presenter';
import type { FamilyQueries } from './family.queries';
import type { FamilyService } from './family.service';
import { NumberingSegment } from './numbering-segment.entity';
import { Numbering } from './numbering.entity';
import { Protein } from './protein.entity';

type OffsetNumbering = z.infer<typeof offsetNumberingBody>;

export class ProteinService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly access: FamilyAccess,
    private readonly queries: FamilyQueries,
    private readonly families: FamilyService,
  ) {}

  async rename(
    personId: string,
    projectId: string,
    proteinId: string,
    version: number,
    organism: string,
  ): Promise<ProteinContract> {
    await this.access.protein(personId, projectId, proteinId, 'edit family');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const protein = await this.current(unit, proteinId, version);
      const before = { organism: protein.organism };
      try {
        await unit.manager.save(Object.assign(protein, { organism }));
      } catch (error) {
        if (!isDuplicate(error)) throw error;
        throw conflict('protein-taken', `There is a protein of ${organism} with the same residues already.`, {
          fields: [{ path: 'organism', message: 'This organism has the same protein already.' }],
        });
      }
      return this.finish(unit, proteinId, 'protein.renamed', before, { organism });
    });
  }

  /** Makes the numbering, or makes it anew under its name. */
  async setOffsetNumbering(
    personId: string,
    projectId: string,
    proteinId: string,
    version: number,
    body: OffsetNumbering,
  ): Promise<ProteinContract> {
    await this.access.protein(personId, projectId, proteinId, 'set numbering');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const protein = await this.current(unit, proteinId, version);
      const known = await unit.manager.findOneBy(Numbering, { proteinId, name: body.name });
      if (body.name === bornNumbering || (known && known.kind !== 'offset')) {
        throw conflict('numbering-name-taken', `The numbering ${body.name} is not one made by an offset.`, {
          fields: [{ path: 'name', message: 'Give it another name.' }],
        });
      }
      await this.writeOffset(unit, protein, known, body);
      await this.prefer(unit, protein.familyId, body);
      // The row itself stays as it is; its version says that something of the protein changed.
      await unit.manager.update(Protein, { id: proteinId }, { organism: protein.organism });
      const before = known ? known.definition : null;
      return this.finish(unit, proteinId, 'numbering.set', before, body);
    });
  }

  private async writeOffset(
    unit: Unit,
    protein: Protein,
    known: Numbering | null,
    { name, offset, skipZero }: OffsetNumbering,
  ): Promise<void> {
    const numbering =
      known ??
      unit.manager.create(Numbering, {
        id: newId(),
        proteinId: protein.id,
        name,
        kind: 'offset',
        createdAt: unit.at,
        createdBy: unit.actorId,
      });
    await unit.manager.save(
      unit.manager.create(Numbering, { ...numbering, definition: { offset, skipZero } }),
    );
    await unit.manager.delete(NumberingSegment, { numberingId: numbering.id });
    const { segments } = offsetNumbering(protein.residues.length, offset, { skipZero });
    await insertMany(
      unit.manager,
      NumberingSegment,
      segments.map((segment) => ({ numberingId: numbering.id, ...segment })),
    );
  }

  private async prefer(unit: Unit, familyId: string, { name, preferred }: OffsetNumbering): Promise<void> {
    const family = await unit.manager.findOneByOrFail(Family, { id: familyId });
    const next = preferred ? name : family.preferredNumbering === name ? null : family.preferredNumbering;
    if (next === family.preferredNumbering) return;
    await unit.manager.update(Family, { id: familyId }, { preferredNumbering: next });
    await this.families.announce(unit, familyId);
  }

  private async current(unit: Unit, proteinId: string, version: number): Promise<Protein> {
    const protein = await unit.manager.findOneByOrFail(Protein, { id: proteinId });
    if (protein.version !== version) throw stale(await this.queries.protein(protein, unit.manager));
    return protein;
  }

  private async finish(
    unit: Unit,
    proteinId: string,
    action: string,
    before: unknown,
    after: unknown,
  ): Promise<ProteinContract> {
    const protein = await unit.manager.findOneByOrFail(Protein, { id: proteinId });
    const presented = await this.queries.protein(protein, unit.manager);
    await unit.audit({ action, subjectKind: 'protein', subjectId: proteinId, before, after });
    unit.announce('protein.changed', proteinId, presented);
    return presented;
  }
}
