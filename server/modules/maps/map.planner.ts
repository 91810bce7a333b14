import type { z } from 'zod';
import type { mapDecisionBody } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { notFound, unusable } from '../../lib/problem';
import type { FamilyAccess, NewProtein, ProteinDirectory } from '../families';
import { ChainLabel, type Chain } from '../structures';
import { mappableChain } from './mappable-chain';
import type { ChainMapper, MappedChain } from './chain-mapper';
import { ResidueMap } from './residue-map.entity';

/** A decision with everything that had to be computed for it; what it rests on never changes. */
export interface PlannedDecision {
  status: ResidueMap['status'];
  action: string;
  /** Where the chain is laid; absent when it stays where it is. */
  target?: {
    projectId: string;
    familyId: string;
    mapped: MappedChain;
    reason: string;
  } & ({ proteinId: string } | { proteinId: null; added: NewProtein });
}

type Decision = z.infer<typeof mapDecisionBody>;

const percent = (fraction: number) => `${Math.round(fraction * 1000) / 10} %`;
const inWords = (lead: string, { identity, coverage }: MappedChain) =>
  `${lead}: ${percent(identity)} identical over ${percent(coverage)} of the chain.`;

/** Computes what a decision needs before the unit of work begins, so that nobody waits for an alignment. */
export class DecisionPlanner {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly families: FamilyAccess,
    private readonly proteins: ProteinDirectory,
    private readonly mapChain: ChainMapper,
  ) {}

  async plan(
    personId: string,
    projectId: string,
    structureName: string,
    chain: Chain,
    body: Decision,
  ): Promise<PlannedDecision> {
    if (chain.kind !== 'protein')
      throw unusable('not-a-protein', 'This chain is not a protein: there is nothing to map.');
    if (body.decision === 'leave out') return { status: 'left out', action: 'map.left-out' };
    if (body.decision === 'add protein')
      return this.addition(personId, projectId, structureName, chain, body);
    if (body.decision === 'correct')
      return {
        status: 'corrected',
        action: 'map.corrected',
        target: await this.onto(projectId, chain, body.proteinId, 'Chosen by hand'),
      };
    const map = await this.unitOfWork.reader.findOneByOrFail(ResidueMap, { chainId: chain.id });
    const confirmed = { status: 'confirmed', action: 'map.confirmed' } as const;
    // A chain that was left out has lost its pairs: they are laid anew.
    if (map.status !== 'left out' || map.proteinId === null) return confirmed;
    return { ...confirmed, target: await this.onto(projectId, chain, map.proteinId, 'Taken up again') };
  }

  private async onto(projectId: string, chain: Chain, proteinId: string, lead: string) {
    const protein = await this.proteins.find(projectId, proteinId);
    if (!protein) throw notFound('protein');
    const mapped = await this.map(chain, protein.id, protein.familyId, protein.residues);
    return {
      projectId,
      familyId: protein.familyId,
      proteinId,
      mapped,
      reason: inWords(`${lead}, ${protein.organism}`, mapped),
    };
  }

  private async addition(
    personId: string,
    projectId: string,
    structureName: string,
    chain: Chain,
    { familyId, organism }: Extract<Decision, { decision: 'add protein' }>,
  ): Promise<PlannedDecision> {
    const family = await this.families.family(personId, projectId, familyId);
    const residues = chain.declared ?? chain.observed;
    const name = `${structureName} chain ${chain.authorId}`.trim().slice(0, 255);
    const mapped = await this.map(chain, '', family.id, residues);
    return {
      status: 'confirmed',
      action: 'map.protein-added',
      target: {
        projectId,
        familyId: family.id,
        proteinId: null,
        added: { name, organism, residues },
        mapped,
        reason: inWords(`Added from this chain, ${organism}`, mapped),
      },
    };
  }

  private async map(chain: Chain, id: string, family: string, residues: string): Promise<MappedChain> {
    const labels = await this.unitOfWork.reader.find(ChainLabel, {
      where: { chainId: chain.id },
      order: { chainIndex: 'ASC' },
    });
    const mapped = await this.mapChain(mappableChain(chain, labels), { id, name: id, family, residues });
    if (!mapped)
      throw unusable('too-long-to-map', 'The chain and this protein are too long to be laid on each other.');
    if (mapped.segments.length === 0)
      throw unusable(
        'nothing-in-common',
        'No residue of the chain can be laid on this protein. Choose another.',
      );
    return mapped;
  }
}
