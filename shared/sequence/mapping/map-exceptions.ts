import { compareLetters, letterOfCode } from '../alphabet';
import { chainIndex, residueIndex } from '../positions';
import type { MapException, MapExceptionKind, MappableChain, MappableResidue } from './chain-types';
import type { Partners } from './tag-ends';

function kindOfPair(
  residue: MappableResidue,
  proteinLetter: string,
  comment: string | undefined,
): MapExceptionKind | null {
  const relation = compareLetters(residue.letter, proteinLetter);
  if (relation === 'undetermined') return 'undetermined';
  if (relation === 'different')
    return comment !== undefined && /ENGINEERED|MUTATION/i.test(comment) ? 'engineered' : 'mismatch';
  const modified = residue.parent !== undefined && letterOfCode(residue.parent) === proteinLetter;
  return modified ? 'modified' : null;
}

/**
 * What is not a plain match, in chain order. `sure` are the partners that every optimal alignment agrees on.
 * A residue may appear twice: as a mismatch, say, and as ambiguous.
 */
export function exceptionsOf(
  chain: MappableChain,
  protein: string,
  partners: Partners,
  sure: Partners,
): MapException[] {
  const comments = new Map(chain.differences.map((difference) => [difference.label, difference.comment]));
  const firstPair = partners.findIndex((partner) => partner !== -1);
  const lastPair = partners.findLastIndex((partner) => partner !== -1);
  const exceptions: MapException[] = [];
  chain.residues.forEach((residue, index) => {
    const partner = partners[index] ?? -1;
    const comment = comments.get(residue.label);
    const add = (kind: MapExceptionKind) =>
      exceptions.push({
        kind,
        chainIndex: chainIndex(index),
        label: residue.label,
        chainLetter: residue.letter,
        proteinIndex: partner === -1 ? null : residueIndex(partner),
        proteinLetter: partner === -1 ? null : protein.charAt(partner),
        ...(comment === undefined ? {} : { note: comment }),
      });
    if (partner === -1) {
      add(index < firstPair || index > lastPair ? 'tag' : 'insertion');
      return;
    }
    const kind = kindOfPair(residue, protein.charAt(partner), comment);
    if (kind !== null) add(kind);
    if (sure[index] !== partner) add('ambiguous');
  });
  return exceptions;
}
