import { In, type EntityManager } from 'typeorm';
import type {
  Family as FamilyContract,
  Protein as ProteinContract,
  ProteinBrief,
} from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { Family } from './family.entity';
import { presentFamily, presentNumbering, presentProtein, presentProteinBrief } from './family.presenter';
import { NumberingSegment } from './numbering-segment.entity';
import { Numbering } from './numbering.entity';
import { Protein } from './protein.entity';

/** Families and proteins as contracts. The manager is that of the unit when called inside one. */
export class FamilyQueries {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async ofProject(projectId: string): Promise<FamilyContract[]> {
    const families = await this.unitOfWork.reader.find(Family, {
      where: { projectId },
      order: { sort: 'ASC', id: 'ASC' },
    });
    return this.present(families);
  }

  async family(familyId: string, manager: EntityManager = this.unitOfWork.reader): Promise<FamilyContract> {
    const family = await manager.findOneByOrFail(Family, { id: familyId });
    const proteinCount = await manager.countBy(Protein, { familyId });
    return presentFamily(family, proteinCount);
  }

  async proteins(familyId: string): Promise<ProteinBrief[]> {
    const proteins = await this.unitOfWork.reader.find(Protein, {
      where: { familyId },
      order: { id: 'ASC' },
    });
    return proteins.map(presentProteinBrief);
  }

  async protein(protein: Protein, manager: EntityManager = this.unitOfWork.reader): Promise<ProteinContract> {
    const family = await manager.findOneByOrFail(Family, { id: protein.familyId });
    const numberings = await manager.find(Numbering, {
      where: { proteinId: protein.id },
      order: { id: 'ASC' },
    });
    const segments = await manager.find(NumberingSegment, {
      where: { numberingId: In(numberings.map((numbering) => numbering.id)) },
      order: { numberingId: 'ASC', residueIndex: 'ASC' },
    });
    return presentProtein(
      protein,
      family,
      numberings.map((numbering) =>
        presentNumbering(
          numbering,
          segments.filter((segment) => segment.numberingId === numbering.id),
        ),
      ),
    );
  }

  private async present(families: readonly Family[]): Promise<FamilyContract[]> {
    const counts: { familyId: string; proteinCount: string }[] = await this.unitOfWork.reader
      .createQueryBuilder(Protein, 'protein')
      .select('protein.familyId', 'familyId')
      .addSelect('COUNT(*)', 'proteinCount')
      .where({ familyId: In(families.map((family) => family.id)) })
      .groupBy('protein.familyId')
      .getRawMany();
    const countOf = new Map(counts.map((row) => [row.familyId, Number(row.proteinCount)]));
    return families.map((family) => presentFamily(family, countOf.get(family.id) ?? 0));
  }
}
