import type { Passport, ResidueLabel, ResidueRef } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { ProteinDirectory } from '../families';
import type { CopyQueries } from './copy.queries';
import type { Site, SiteQueries } from './site.queries';

/** Everything a residue is called, and where it stands. */
export class PassportQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly proteins: ProteinDirectory,
    private readonly sites: SiteQueries,
    private readonly copyQueries: CopyQueries,
  ) {}

  async passport(projectId: string, { proteinId, residueIndex }: ResidueRef): Promise<Passport> {
    const protein = await this.proteins.find(projectId, proteinId);
    if (!protein || residueIndex >= protein.residues.length) throw notFound('residue');
    const [site, copies, pinned, numberings] = await Promise.all([
      this.sites.site(proteinId, residueIndex),
      this.copyQueries.copies(proteinId, residueIndex),
      this.pinnedIndices(proteinId),
      this.proteins.labelsOfResidue(proteinId, residueIndex),
    ]);
    const neighbours = [residueIndex - 1, residueIndex + 1].filter(
      (at) => at >= 0 && at < protein.residues.length,
    );
    const refs = [
      { proteinId, residueIndex },
      ...neighbours.map((at) => ({ proteinId, residueIndex: at })),
      ...site.members.map((member) => ({ proteinId: member.proteinId, residueIndex: member.residueIndex })),
    ];
    const labels = await this.proteins.presentLabels(refs);
    const labelOf = (ref: ResidueRef): ResidueLabel | undefined =>
      labels.find((label) => label.proteinId === ref.proteinId && label.residueIndex === ref.residueIndex);
    const residue = labelOf({ proteinId, residueIndex });
    if (!residue) throw notFound('residue');
    return {
      residue,
      proteinName: protein.name,
      proteinLength: protein.residues.length,
      familyVersion: protein.version,
      labels: numberings,
      column: site.column && { ...site.column, gapCount: site.gaps.length, shares: shares(site, residue) },
      equivalents: site.members.flatMap((member) => {
        const label = labelOf(member);
        return label ? [{ ...label, grade: member.grade, letterRelation: member.relation }] : [];
      }),
      gaps: site.gaps,
      copies,
      previous: labelOf({ proteinId, residueIndex: residueIndex - 1 }) ?? null,
      next: labelOf({ proteinId, residueIndex: residueIndex + 1 }) ?? null,
      pinnedIndices: pinned,
    };
  }

  private async pinnedIndices(proteinId: string): Promise<number[]> {
    const rows: { residueIndex: number }[] = await this.unitOfWork.reader.query(
      `SELECT DISTINCT pin.residue_index residueIndex FROM pin
         JOIN annotation a ON a.id = pin.annotation_id
        WHERE pin.protein_id = ? AND a.status <> 'retired' ORDER BY pin.residue_index`,
      [proteinId],
    );
    return rows.map((row) => row.residueIndex);
  }
}

/** How many rows carry which letter in the column, most frequent first; the residue's own row counts too. */
function shares(site: Site, own: ResidueLabel) {
  const organisms = new Map<string, string[]>([[own.letter, [own.organism]]]);
  for (const member of site.members) {
    organisms.set(member.letter, [...(organisms.get(member.letter) ?? []), member.organism]);
  }
  return [...organisms]
    .map(([letter, carriers]) => ({ letter, count: carriers.length, organisms: carriers }))
    .sort((one, other) => other.count - one.count || one.letter.localeCompare(other.letter));
}
