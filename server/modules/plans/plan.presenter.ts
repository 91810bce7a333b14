import type {
  Construct as ConstructContract,
  Design as DesignContract,
  Mutant as MutantContract,
  PersonBrief,
} from '../../../shared/contracts';
import type { Family, Protein } from '../families';
import type { ConstructRevision } from './construct-revision.entity';
import type { Construct } from './construct.entity';
import type { Design } from './design.entity';
import type { Mutant } from './mutant.entity';
import type { Primer } from './primer.entity';

type Changes = MutantContract['mutations'];

export function presentConstruct(
  construct: Construct,
  revision: ConstructRevision,
  { protein, family }: { protein: Protein; family: Family },
  by: PersonBrief,
): ConstructContract {
  const { bases, circular, codingStart, codingLength, geneticCode, encoded, segments, issues } = revision;
  return {
    id: construct.id,
    name: construct.name,
    revisionId: revision.id,
    bases,
    circular,
    codingStart,
    codingLength,
    geneticCode,
    encoded,
    proteinId: protein.id,
    familyId: family.id,
    family: family.name,
    organism: protein.organism,
    segments,
    issues,
    by,
    at: construct.createdAt.toISOString(),
    version: construct.version,
  };
}

export function presentDesign(design: Design, primers: readonly Primer[], changes: Changes): DesignContract {
  const { id, scheme, rank, checks, reasons, withinLimits, proved, proof, chosen } = design;
  return {
    id,
    scheme,
    rank,
    primers: primers
      .filter((primer) => primer.designId === id)
      .map(({ name, bases, strand, start, length, figures }) => ({
        name,
        bases,
        strand,
        start,
        length,
        ...figures,
      })),
    codons: design.codons.flatMap(({ residueIndex, ...codon }) => {
      const change = changes.find((one) => one.residue.residueIndex === residueIndex);
      return change ? [{ residue: change.residue, ...codon }] : [];
    }),
    checks,
    reasons,
    withinLimits,
    proved,
    proof,
    chosen,
  };
}

export function presentMutant(
  mutant: Mutant,
  mutations: Changes,
  designs: DesignContract[],
  constructName: string | null,
  by: PersonBrief,
): MutantContract {
  return {
    id: mutant.id,
    name: mutations.map((one) => `${one.oldResidues}${one.residue.label}${one.newResidues}`).join('+'),
    constructId: mutant.constructId,
    constructName,
    state: mutant.state,
    reason: mutant.reason,
    mutations,
    designs,
    by,
    at: mutant.createdAt.toISOString(),
    version: mutant.version,
  };
}
