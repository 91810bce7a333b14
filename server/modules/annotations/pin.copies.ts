import { In } from 'typeorm';
import type { newPin } from '../../../shared/contracts';
import type { z } from 'zod';
import type { UnitOfWork } from '../../db';
import { notFound, unusable } from '../../lib/problem';
import { Chain, Structure } from '../structures';

type NewPin = z.infer<typeof newPin>;

/** A pin speaks of all copies unless it names a structure of the project, and perhaps chains of it. */
export async function checkCopies(
  { reader }: UnitOfWork,
  projectId: string,
  pins: readonly NewPin[],
): Promise<void> {
  const named = pins.filter((pin) => pin.structureId !== undefined);
  if (pins.some((pin) => pin.chains?.length && !pin.structureId)) {
    throw unusable('structure-needed', 'Chains belong to a structure. Say which one they are of.');
  }
  if (named.length === 0) return;
  const structures = await reader.findBy(Structure, {
    projectId,
    id: In(named.map((pin) => pin.structureId)),
  });
  const chains = await reader.find(Chain, {
    select: { revisionId: true, authorId: true },
    where: { revisionId: In(structures.flatMap((structure) => structure.currentRevisionId ?? [])) },
  });
  for (const pin of named) {
    const structure = structures.find((one) => one.id === pin.structureId);
    if (!structure) throw notFound('structure');
    const known = chains
      .filter((chain) => chain.revisionId === structure.currentRevisionId)
      .map((chain) => chain.authorId);
    const missing = pin.chains?.find((authorId) => !known.includes(authorId));
    if (missing !== undefined) {
      throw unusable(
        'no-such-chain',
        `${structure.name} has no chain ${missing}; its chains are ${known.join(', ')}.`,
      );
    }
  }
}
