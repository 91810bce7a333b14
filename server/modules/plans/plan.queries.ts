import { In, type EntityManager } from 'typeorm';
import type { Construct as ConstructContract, Mutant as MutantContract } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import type { ProteinDirectory } from '../families';
import { ConstructRevision } from './construct-revision.entity';
import { Construct } from './construct.entity';
import { Design } from './design.entity';
import { Mutant } from './mutant.entity';
import { Mutation } from './mutation.entity';
import { presentConstruct, presentDesign, presentMutant } from './plan.presenter';
import { Primer } from './primer.entity';

interface Filter {
  proteinId?: string | undefined;
  residueIndex?: number | undefined;
}

const listedAtMost = 500;

export class PlanQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly proteins: ProteinDirectory,
  ) {}

  async constructs(projectId: string): Promise<ConstructContract[]> {
    const rows = await this.unitOfWork.reader.find(Construct, {
      where: { projectId },
      order: { id: 'DESC' },
      take: listedAtMost,
    });
    return this.presentConstructs(rows);
  }

  async presentConstructs(
    constructs: readonly Construct[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<ConstructContract[]> {
    const revisions = await manager.findBy(ConstructRevision, {
      id: In(constructs.flatMap((construct) => construct.currentRevisionId ?? [])),
    });
    const [proteins, brief] = await Promise.all([
      this.proteins.byIds(revisions.map((revision) => revision.proteinId)),
      this.people.briefs(constructs.map((construct) => construct.createdBy)),
    ]);
    const families = await this.proteins.familiesByIds(
      [...proteins.values()].map((protein) => protein.familyId),
    );
    return constructs.flatMap((construct) => {
      const revision = revisions.find((one) => one.id === construct.currentRevisionId);
      const protein = revision && proteins.get(revision.proteinId);
      const family = protein && families.get(protein.familyId);
      return revision && protein && family
        ? [presentConstruct(construct, revision, { protein, family }, brief(construct.createdBy))]
        : [];
    });
  }

  /** The newest first. */
  async mutants(projectId: string, filter: Filter): Promise<MutantContract[]> {
    return this.presentMutants(await this.page(projectId, filter));
  }

  /** Every mutant of the project, for an export that must leave none out; a page at a time. */
  async allMutants(projectId: string): Promise<MutantContract[]> {
    const all: MutantContract[] = [];
    let before: string | undefined;
    for (;;) {
      const rows = await this.page(projectId, {}, before);
      all.push(...(await this.presentMutants(rows)));
      before = rows.at(-1)?.id;
      if (rows.length < listedAtMost) return all;
    }
  }

  private page(projectId: string, { proteinId, residueIndex }: Filter, before?: string): Promise<Mutant[]> {
    const query = this.unitOfWork.reader
      .createQueryBuilder(Mutant, 'mutant')
      .where('mutant.projectId = :projectId', { projectId })
      .orderBy('mutant.id', 'DESC')
      .limit(listedAtMost);
    if (before !== undefined) query.andWhere('mutant.id < :before', { before });
    if (proteinId !== undefined) {
      const at = residueIndex === undefined ? '' : ' AND m.residue_index = :residueIndex';
      query.andWhere(
        `EXISTS (SELECT 1 FROM mutation m WHERE m.mutant_id = mutant.id AND m.protein_id = :proteinId${at})`,
        { proteinId, residueIndex },
      );
    }
    return query.getMany();
  }

  async presentMutants(
    mutants: readonly Mutant[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<MutantContract[]> {
    const ids = mutants.map((mutant) => mutant.id);
    const [mutations, designs, constructs, brief] = await Promise.all([
      manager.find(Mutation, { where: { mutantId: In(ids) }, order: { mutantId: 'ASC', ordinal: 'ASC' } }),
      manager.find(Design, { where: { mutantId: In(ids) }, order: { rank: 'ASC' } }),
      manager.findBy(Construct, { id: In(mutants.flatMap((mutant) => mutant.constructId ?? [])) }),
      this.people.briefs(mutants.map((mutant) => mutant.createdBy)),
    ]);
    const primers = await manager.find(Primer, {
      where: { designId: In(designs.map((design) => design.id)) },
      order: { designId: 'ASC', ordinal: 'ASC' },
    });
    const labels = await this.proteins.presentLabels(mutations);
    return mutants.map((mutant) => {
      const changes = mutations.flatMap((mutation, at) => {
        const residue = labels[at];
        return mutation.mutantId === mutant.id && residue
          ? [{ residue, oldResidues: mutation.oldResidues, newResidues: mutation.newResidues }]
          : [];
      });
      const own = designs
        .filter((design) => design.mutantId === mutant.id)
        .map((design) => presentDesign(design, primers, changes));
      const construct = constructs.find((one) => one.id === mutant.constructId);
      return presentMutant(mutant, changes, own, construct?.name ?? null, brief(mutant.createdBy));
    });
  }
}
