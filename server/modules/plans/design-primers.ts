import { readCoding } from '../../../shared/sequence/construct/coding';
import type { Host } from '../../../shared/sequence/construct/codon-choice';
import type { GeneticCodeId } from '../../../shared/sequence/construct/genetic-code';
import { matchProtein } from '../../../shared/sequence/construct/match-protein';
import { labelOfResidue } from '../../../shared/sequence/numbering/numbering';
import type { ParseResult } from '../../../shared/sequence/parse-result';
import { residueIndex } from '../../../shared/sequence/positions';
import { designComplementaryPair } from '../../../shared/sequence/primers/complementary-pair';
import { placeChanges, preparePrimerConstruct } from '../../../shared/sequence/primers/construct';
import type { Design } from '../../../shared/sequence/primers/types';
import { unusable } from '../../lib/problem';
import type { NumberedProtein } from '../families';
import type { ConstructRevision } from './construct-revision.entity';
import type { Mutation } from './mutation.entity';

export interface ProvedDesign extends Design {
  /** What the proof found, in a sentence. */
  proof: string;
}

function orRefuse<T>(result: ParseResult<T>): T {
  if (result.value !== null) return result.value;
  const detail = result.issues
    .filter((issue) => issue.severity === 'error')
    .map((issue) => issue.message)
    .join(' ');
  throw unusable('no-design', detail || 'No primer pair could be designed.', { issues: result.issues });
}

/** Primer pairs for a mutant in a construct; only those whose product was read back and encodes just the change. */
export function designPrimers(
  revision: ConstructRevision,
  { protein, preferred }: NumberedProtein,
  mutations: readonly Mutation[],
  host: Host,
): ProvedDesign[] {
  if (mutations.some((mutation) => mutation.proteinId !== protein.id)) {
    throw unusable(
      'other-protein',
      'This construct encodes another protein than the one the change was planned on.',
    );
  }
  const { bases, circular, codingStart, geneticCode } = revision;
  const coding = orRefuse(
    readCoding({ bases, circular, start: codingStart + 1, table: geneticCode as GeneticCodeId }),
  );
  const match = orRefuse(matchProtein(coding, protein.residues));
  const changes = mutations.map((mutation) => {
    const at = residueIndex(mutation.residueIndex);
    const label = labelOfResidue(preferred, at) ?? String(mutation.residueIndex + 1);
    return { residueIndex: at, label, from: mutation.oldResidues, to: mutation.newResidues };
  });
  const name = changes.map(({ from, label, to }) => `${from}${label}${to}`).join('+');
  const placed = orRefuse(placeChanges({ asked: name, changes }, coding, match));
  const designs = orRefuse(
    designComplementaryPair(preparePrimerConstruct(bases, coding), placed, { host, name }),
  );
  const proved = designs.filter((design) => design.proved);
  if (proved.length === 0) throw unusable('no-design', 'No design could be proved, so none is shown.');
  return proved.map((design) => ({
    ...design,
    proof: `Built from the primers and read back: ${design.product.length} bases, ${design.encodes.length} residues, ${name} and no other change.`,
  }));
}
