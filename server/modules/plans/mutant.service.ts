import { In } from 'typeorm';
import type { z } from 'zod';
import type { designBody, Mutant as MutantContract, newMutantBody } from '../../../shared/contracts';
import { checkMutant } from '../../../shared/sequence/construct/mutation-check';
import { parseMutations } from '../../../shared/sequence/construct/mutation';
import type { Unit, UnitOfWork } from '../../db';
import { sha256 } from '../../lib/hash';
import { newId } from '../../lib/new-id';
import { conflict, notFound, stale, unusable } from '../../lib/problem';
import type { ProteinDirectory } from '../families';
import type { ProjectAccess } from '../projects';
import { designPrimers } from './design-primers';
import { Design } from './design.entity';
import { Mutant } from './mutant.entity';
import { Mutation } from './mutation.entity';
import type { PlanAccess } from './plan.access';
import type { PlanQueries } from './plan.queries';
import { Primer } from './primer.entity';

export class MutantService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly access: PlanAccess,
    private readonly proteins: ProteinDirectory,
    private readonly queries: PlanQueries,
  ) {}

  async make(
    personId: string,
    projectId: string,
    body: z.infer<typeof newMutantBody>,
  ): Promise<MutantContract> {
    await this.projects.may(personId, projectId, 'plan');
    await this.proteins.mustFind(projectId, body.proteinId);
    if (body.constructId) await this.access.construct(personId, projectId, body.constructId);
    const changes = await this.readChanges(body.proteinId, body.changes);
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const mutant = unit.manager.create(Mutant, {
        id: newId(),
        projectId,
        constructId: body.constructId,
        state: 'planned',
        reason: body.reason,
        createdAt: unit.at,
        createdBy: personId,
      });
      await unit.manager.save(mutant);
      await unit.manager.insert(
        Mutation,
        changes.map(({ residueIndex, from, to }, ordinal) => ({
          mutantId: mutant.id,
          ordinal,
          proteinId: body.proteinId,
          residueIndex,
          length: 1,
          oldResidues: from,
          newResidues: to,
        })),
      );
      return this.finish(unit, mutant, 'mutant.planned', null, {
        changes: body.changes,
        reason: body.reason,
      });
    });
  }

  /** Designs primers in a construct and keeps them, proved ones only; earlier designs of the mutant give way. */
  async design(
    personId: string,
    projectId: string,
    mutantId: string,
    version: number,
    body: z.infer<typeof designBody>,
  ) {
    await this.access.mutant(personId, projectId, mutantId);
    await this.projects.may(personId, projectId, 'plan');
    const { revision } = await this.access.construct(personId, projectId, body.constructId);
    const mutations = await this.unitOfWork.reader.find(Mutation, {
      where: { mutantId },
      order: { ordinal: 'ASC' },
    });
    const numbered = await this.proteins.numbered(revision.proteinId);
    const designs = designPrimers(revision, numbered, mutations, body.host);
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const mutant = await this.current(unit, mutantId, version);
      const earlier = await unit.manager.findBy(Design, { mutantId });
      await unit.manager.delete(Primer, { designId: In(earlier.map((one) => one.id)) });
      await unit.manager.delete(Design, { mutantId });
      for (const design of designs) {
        const id = newId();
        await unit.manager.insert(Design, {
          id,
          mutantId,
          constructRevisionId: revision.id,
          scheme: 'complementary-pair',
          rank: design.rank,
          settings: { host: body.host } as object,
          codons: design.changes.map(
            ({ residueIndex, codonStart, codonFrom, codonTo, changedBases, hostShare, chosenBy }) => ({
              residueIndex,
              codonStart,
              codonFrom,
              codonTo,
              changedBases,
              hostShare,
              chosenBy,
            }),
          ),
          checks: design.checks.map((check) => ({ ...check, primer: check.primer ?? null })),
          reasons: design.reasons,
          productHash: sha256(design.product),
          withinLimits: design.withinLimits,
          proved: design.proved,
          proof: design.proof,
          chosen: false,
          createdAt: unit.at,
          createdBy: personId,
        });
        await unit.manager.insert(
          Primer,
          design.primers.map(
            ({ name, bases, strand, start, length, misprimingSites, ...figures }, ordinal) => ({
              designId: id,
              ordinal,
              name,
              bases,
              strand,
              start,
              length,
              figures: {
                gcPercent: figures.gcPercent,
                meltingCelsius: figures.meltingCelsius,
                annealingCelsius: figures.annealingCelsius,
                hairpinKcalPerMol: figures.hairpinKcalPerMol,
                selfDimerKcalPerMol: figures.selfDimerKcalPerMol,
                misprimingSites: misprimingSites.length,
              },
            }),
          ),
        );
      }
      await this.saveNext(unit, Object.assign(mutant, { constructId: body.constructId, state: 'designed' }));
      return this.finish(unit, mutant, 'mutant.designed', null, { host: body.host, designs: designs.length });
    });
  }

  async choose(personId: string, projectId: string, mutantId: string, version: number, designId: string) {
    await this.access.mutant(personId, projectId, mutantId);
    await this.projects.may(personId, projectId, 'plan');
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const mutant = await this.current(unit, mutantId, version);
      const design = await unit.manager.findOneBy(Design, { id: designId, mutantId });
      if (!design) throw notFound('design');
      if (!design.proved) throw conflict('unproved', 'This design was not proved and cannot be chosen.');
      const before = await unit.manager.findOneBy(Design, { mutantId, chosen: true });
      await unit.manager.update(Design, { mutantId }, { chosen: false });
      await unit.manager.update(Design, { id: designId }, { chosen: true });
      await this.saveNext(unit, mutant);
      return this.finish(
        unit,
        mutant,
        'mutant.design-chosen',
        { designId: before?.id ?? null },
        { designId },
      );
    });
  }

  private async readChanges(proteinId: string, text: string) {
    const { preferred, protein, family } = await this.proteins.numbered(proteinId);
    const refuse = (detail: string, issues: Parameters<typeof unusable>[2]) =>
      unusable('mutation-refused', detail, { ...issues, fields: [{ path: 'changes', message: detail }] });
    const parsed = parseMutations(text, {}, [family.name, ...family.aliases]);
    const request = parsed.value?.[0];
    if (!request || (parsed.value?.length ?? 0) > 1) {
      const several = 'Plan one mutant at a time; changes made together are joined by +, like E62Q+R41K.';
      throw refuse(parsed.issues.map((issue) => issue.message).join(' ') || several, {
        issues: parsed.issues,
      });
    }
    const checked = checkMutant(request, protein.residues, preferred);
    if (!checked.value) {
      throw refuse(checked.issues.map((issue) => issue.message).join(' '), { issues: checked.issues });
    }
    return checked.value.changes;
  }

  private async current(unit: Unit, mutantId: string, version: number): Promise<Mutant> {
    const mutant = await unit.manager.findOneByOrFail(Mutant, { id: mutantId });
    if (mutant.version !== version)
      throw stale((await this.queries.presentMutants([mutant], unit.manager))[0]);
    return mutant;
  }

  /** The version counts every change people see: designs, and the chosen one, are part of their mutant. */
  private async saveNext(unit: Unit, mutant: Mutant): Promise<void> {
    mutant.version += 1;
    await unit.manager.save(mutant);
  }

  private async finish(unit: Unit, mutant: Mutant, action: string, before: unknown, after: unknown) {
    const [presented] = await this.queries.presentMutants([mutant], unit.manager);
    if (!presented) throw new Error('The mutant just written cannot be read.');
    await unit.audit({ action, subjectKind: 'mutant', subjectId: mutant.id, before, after });
    unit.announce('mutant.changed', mutant.id, presented);
    return presented;
  }
}
