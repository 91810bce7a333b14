import type { LocateReply, Passport } from '@/shared/contracts/residues';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { relabels } from '@/client/relabels';

/** A passport is worked out from nearly everything: it is read again when something it stands on changed. */
export function applyToPassport(passport: Passport, fact: Fact): Applied<Passport> {
  return touchesPassport(passport, fact) ? outOfDate : passport;
}

function touchesPassport({ residue, copies, equivalents }: Passport, fact: Fact): boolean {
  switch (fact.kind) {
    case 'protein.changed':
      // A new protein of the family may stand in the column too.
      return fact.payload.familyId === residue.familyId || relabels(fact, equivalents);
    case 'family.changed':
      return fact.payload.id === residue.familyId;
    case 'alignment.changed':
      return fact.payload.familyId === residue.familyId;
    case 'structure.changed':
      return copies.some(({ structureId }) => structureId === fact.payload.id);
    case 'map.decided':
      return (
        fact.payload.proteinId === residue.proteinId ||
        copies.some(({ chainId }) => chainId === fact.payload.chainId)
      );
    case 'annotation.changed':
      return fact.payload.pins.some(({ proteinId }) => proteinId === residue.proteinId);
    default:
      return false;
  }
}

/** What a typed address can mean, with how many pins are there. */
export function applyToLocated(located: LocateReply, fact: Fact): Applied<LocateReply> {
  const touched =
    fact.kind === 'protein.changed' ||
    fact.kind === 'family.changed' ||
    fact.kind === 'alignment.changed' ||
    fact.kind === 'structure.changed' ||
    fact.kind === 'map.decided' ||
    (fact.kind === 'annotation.changed' &&
      fact.payload.pins.some((pin) =>
        located.readings.some(
          ({ residue }) => residue.proteinId === pin.proteinId && residue.residueIndex === pin.residueIndex,
        ),
      ));
  return touched ? outOfDate : located;
}
