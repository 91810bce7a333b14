import type { LocateReply, Reading, ResidueLabel } from '../../../shared/contracts';
import { readAddress } from '../../../shared/sequence/address/read-address';
import type { AddressReading } from '../../../shared/sequence/address/types';
import { codeOfLetter } from '../../../shared/sequence/alphabet';
import type { UnitOfWork } from '../../db';
import { Family, type ProteinDirectory } from '../families';
import type { AddressLookup, FoundResidue } from './address.lookup';

const readingsInGroup = 12;
const readingsInAll = 60;

interface Candidate {
  reading: AddressReading;
  found: FoundResidue;
}

/** What a typed address can mean in a project: every reading with its reason, none chosen silently. */
export class LocateQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly proteins: ProteinDirectory,
    private readonly lookup: AddressLookup,
  ) {}

  async locate(projectId: string, text: string): Promise<LocateReply> {
    if (text.trim() === '') return { text, readings: [], notReadAs: [], more: false };
    const [families, chainIds] = await Promise.all([
      this.unitOfWork.reader.find(Family, { where: { projectId }, order: { sort: 'ASC' } }),
      this.chainIds(projectId),
    ]);
    const address = readAddress(text, { families, chainIds });
    const notReadAs = [...address.notReadAs];
    const candidates: Candidate[] = [];
    let isMore = false;
    for (const reading of address.readings) {
      const { found, notes } = await this.residuesOf(projectId, reading);
      notReadAs.push(...notes);
      const distinct = rank(reading, found);
      isMore ||= distinct.length > readingsInGroup;
      candidates.push(...distinct.slice(0, readingsInGroup).map((one) => ({ reading, found: one })));
    }
    // A reading whose letter does not stand there comes behind all whose letter does.
    const ordered = [...candidates.filter((one) => !mismatch(one)), ...candidates.filter(mismatch)];
    const page = ordered.slice(0, readingsInAll);
    const labels = await this.proteins.presentLabels(page.map((one) => one.found));
    const pinCounts = await this.pinCounts(page.map((one) => one.found));
    return {
      text,
      readings: page.flatMap((candidate, at) => {
        const label = labels[at];
        return label ? [present(candidate, label, pinCounts(candidate.found))] : [];
      }),
      notReadAs: [...new Set(notReadAs)],
      more: isMore || ordered.length > readingsInAll,
    };
  }

  private async residuesOf(projectId: string, reading: AddressReading) {
    if (reading.kind === 'chain') {
      const { found, unmapped } = await this.lookup.byChain(projectId, reading);
      const nowhere = `Chain ${reading.chainId ?? ''}: no current structure has a residue ${reading.label} there.`;
      return { found, notes: found.length + unmapped.length > 0 ? unmapped : [nowhere] };
    }
    // Several numberings may lead to one residue, so more rows are read than are shown.
    const found = await this.lookup.byNumber(projectId, reading, readingsInGroup * 40);
    return { found, notes: [] };
  }

  private async chainIds(projectId: string): Promise<string[]> {
    const rows: { authorId: string }[] = await this.unitOfWork.reader.query(
      `SELECT DISTINCT c.author_id authorId FROM structure st
         JOIN chain c ON c.revision_id = st.current_revision_id WHERE st.project_id = ?`,
      [projectId],
    );
    return rows.map((row) => row.authorId);
  }

  private async pinCounts(refs: readonly FoundResidue[]): Promise<(ref: FoundResidue) => number> {
    if (refs.length === 0) return () => 0;
    const rows: { proteinId: string; residueIndex: number; pins: string }[] =
      await this.unitOfWork.reader.query(
        `SELECT pin.protein_id proteinId, pin.residue_index residueIndex, COUNT(*) pins FROM pin
         JOIN annotation a ON a.id = pin.annotation_id AND a.status <> 'retired'
        WHERE (pin.protein_id, pin.residue_index) IN (${refs.map(() => '(?, ?)').join(', ')})
        GROUP BY pin.protein_id, pin.residue_index`,
        refs.flatMap((ref) => [ref.proteinId, ref.residueIndex]),
      );
    return (ref) =>
      Number(
        rows.find((row) => row.proteinId === ref.proteinId && row.residueIndex === ref.residueIndex)?.pins ??
          0,
      );
  }
}

/** Each residue once; the stated letter first, then labels in the numbering people prefer. */
function rank(reading: AddressReading, found: readonly FoundResidue[]): FoundResidue[] {
  const score = (one: FoundResidue) =>
    (reading.letter !== null && one.letter !== reading.letter ? 2 : 0) + (one.isPreferred ? 0 : 1);
  const sorted = [...found].sort((one, other) => score(one) - score(other));
  const seen = new Set<string>();
  return sorted.filter((one) => {
    const key = `${one.proteinId}:${one.residueIndex}`;
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
}

const mismatch = ({ reading, found }: Candidate): boolean =>
  reading.letter !== null && reading.letter !== found.letter;

function present(candidate: Candidate, residue: ResidueLabel, pinCount: number): Reading {
  const { reading, found } = candidate;
  const says = reading.letter !== null && mismatch(candidate);
  const isShown = found.isPreferred || found.where === residue.numbering;
  const where = isShown
    ? found.where
    : `${found.where} ${reading.label} is ${residue.numbering} ${residue.label}`;
  return {
    residue,
    group: reading.group,
    spelling: reading.spelling,
    reason: `${where}; ${reading.reason}`,
    mismatch: says ? `says ${codeOfLetter(reading.letter ?? '')}, is ${codeOfLetter(found.letter)}` : null,
    mutationTo: reading.mutationTo,
    pinCount,
  };
}
