import { In } from 'typeorm';
import { sequenceNumbering } from '../../../shared/sequence/numbering/numbering';
import type { Unit } from '../../db';
import { insertMany } from '../../db/insert-many';
import { sha256 } from '../../lib/hash';
import { newId } from '../../lib/new-id';
import type { Family } from './family.entity';
import { bornNumbering } from './family.presenter';
import { NumberingSegment } from './numbering-segment.entity';
import { Numbering } from './numbering.entity';
import { Protein } from './protein.entity';

export interface NewProtein {
  /** As in the file. */
  name: string;
  organism: string;
  /** Upper case, ungapped. */
  residues: string;
  /** Number of the first residue, where the file states it; else 1. */
  firstNumber?: number;
}

const longestOrganism = 120;
const hashesAtOnce = 1000;

/**
 * The proteins of these sequences, one for each in the order given: those the family has already (the same residues
 * and the same organism, or the same name in the file they came from), else new ones. Equal residues among the
 * sequences given are one protein.
 */
export async function addProteins(
  unit: Unit,
  family: Pick<Family, 'id' | 'projectId'>,
  sequences: readonly NewProtein[],
): Promise<{ ids: string[]; added: Protein[] }> {
  const hashes = sequences.map((sequence) => sha256(sequence.residues));
  const known = await proteinsByHash(unit, family.id, hashes);
  const groups = new Map<string, NewProtein[]>();
  sequences.forEach((sequence, at) => {
    const hash = hashes[at] ?? '';
    groups.set(hash, [...(groups.get(hash) ?? []), sequence]);
  });
  const idOf = new Map<string, string>();
  const added: Protein[] = [];
  const numberings: Numbering[] = [];
  const segments: NumberingSegment[] = [];
  for (const [hash, group] of groups) {
    const first = group[0];
    if (!first) continue;
    const there = sameProtein(known.get(hash) ?? [], group);
    if (there) {
      idOf.set(hash, there.id);
      continue;
    }
    const protein = makeProtein(unit, family, hash, first);
    const numbering = unit.manager.create(Numbering, {
      id: newId(),
      proteinId: protein.id,
      name: bornNumbering,
      kind: 'sequence',
      definition: { first: first.firstNumber ?? 1 },
      createdAt: unit.at,
      createdBy: unit.actorId,
    });
    added.push(protein);
    numberings.push(numbering);
    for (const run of sequenceNumbering(first.residues.length, first.firstNumber).segments) {
      segments.push(unit.manager.create(NumberingSegment, { numberingId: numbering.id, ...run }));
    }
    idOf.set(hash, protein.id);
  }
  await insertMany(unit.manager, Protein, added);
  await insertMany(unit.manager, Numbering, numberings as never[]);
  await insertMany(unit.manager, NumberingSegment, segments);
  return { ids: hashes.map((hash) => idOf.get(hash) ?? ''), added };
}

async function proteinsByHash(unit: Unit, familyId: string, hashes: readonly string[]) {
  const found = new Map<string, Protein[]>();
  const asked = [...new Set(hashes)];
  for (let start = 0; start < asked.length; start += hashesAtOnce) {
    const proteins = await unit.manager.find(Protein, {
      where: { familyId, residuesHash: In(asked.slice(start, start + hashesAtOnce)) },
      order: { id: 'ASC' },
    });
    for (const protein of proteins) {
      found.set(protein.residuesHash, [...(found.get(protein.residuesHash) ?? []), protein]);
    }
  }
  return found;
}

/** A protein that was given another organism by hand is still known by the name it came with. */
function sameProtein(known: readonly Protein[], group: readonly NewProtein[]): Protein | undefined {
  return (
    known.find((protein) => group.some((one) => organismOf(one) === protein.organism)) ??
    known.find((protein) => group.some((one) => one.name === protein.name))
  );
}

const organismOf = (sequence: NewProtein): string =>
  [...sequence.organism].slice(0, longestOrganism).join('');

function makeProtein(
  unit: Unit,
  family: Pick<Family, 'id' | 'projectId'>,
  residuesHash: string,
  sequence: NewProtein,
): Protein {
  return unit.manager.create(Protein, {
    id: newId(),
    familyId: family.id,
    projectId: family.projectId,
    organism: organismOf(sequence),
    name: sequence.name,
    residues: sequence.residues,
    residuesHash,
    succeedsId: null,
    createdAt: unit.at,
    createdBy: unit.actorId,
  });
}
