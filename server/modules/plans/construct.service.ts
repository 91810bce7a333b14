import type { z } from 'zod';
import type { Construct as ConstructContract, newConstructBody } from '../../../shared/contracts';
import { readCoding, type Coding } from '../../../shared/sequence/construct/coding';
import { isGeneticCodeId } from '../../../shared/sequence/construct/genetic-code';
import { matchProtein, type ProteinMatch } from '../../../shared/sequence/construct/match-protein';
import { readDna } from '../../../shared/sequence/construct/read-dna';
import { labelOfResidue } from '../../../shared/sequence/numbering/numbering';
import type { ParseResult, Issue } from '../../../shared/sequence/parse-result';
import type { UnitOfWork } from '../../db';
import { newId } from '../../lib/new-id';
import { unusable } from '../../lib/problem';
import type { ProteinDirectory } from '../families';
import type { ProjectAccess } from '../projects';
import { ConstructRevision } from './construct-revision.entity';
import { Construct } from './construct.entity';
import type { PlanQueries } from './plan.queries';

const issuesKept = 200;

/** The value, or a refusal that lists every issue at its place. */
function orRefuse<T>(result: ParseResult<T>, code: string, collected: Issue[], path: string): T {
  collected.push(...result.issues);
  if (result.value !== null) return result.value;
  const errors = result.issues.filter((issue) => issue.severity === 'error');
  const detail = errors[0]?.message ?? 'This DNA cannot be used.';
  throw unusable(code, detail, {
    issues: collected.slice(0, issuesKept),
    fields: [{ path, message: errors.map((issue) => issue.message).join(' ') }],
  });
}

export class ConstructService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly proteins: ProteinDirectory,
    private readonly queries: PlanQueries,
  ) {}

  async make(
    personId: string,
    projectId: string,
    body: z.infer<typeof newConstructBody>,
  ): Promise<ConstructContract> {
    await this.projects.may(personId, projectId, 'plan');
    await this.proteins.mustFind(projectId, body.proteinId);
    const read = await this.read(body);
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const made = { createdAt: unit.at, createdBy: personId };
      const revisionId = newId();
      const construct = unit.manager.create(Construct, { id: newId(), projectId, name: body.name, ...made });
      construct.currentRevisionId = revisionId;
      await unit.manager.save(construct);
      await unit.manager.insert(ConstructRevision, {
        id: revisionId,
        constructId: construct.id,
        bases: read.bases,
        circular: body.circular,
        codingStart: read.coding.start,
        codingLength: read.coding.length,
        geneticCode: body.geneticCode,
        encoded: read.coding.protein,
        proteinId: body.proteinId,
        segments: read.match.segments.map((segment) => ({
          codonStart: segment.codon,
          proteinStart: segment.residueIndex,
          length: segment.length,
        })),
        issues: read.issues,
        ...made,
      });
      const [presented] = await this.queries.presentConstructs([construct], unit.manager);
      if (!presented) throw new Error('The construct just written cannot be read.');
      const { name, circular, codingStart, geneticCode, proteinId } = body;
      await unit.audit({
        action: 'construct.made',
        subjectKind: 'construct',
        subjectId: construct.id,
        after: { name, circular, codingStart, geneticCode, proteinId, bases: read.bases.length },
      });
      unit.announce('construct.changed', construct.id, presented);
      return presented;
    });
  }

  /** Reads and checks without storing anything. */
  private async read(
    body: z.infer<typeof newConstructBody>,
  ): Promise<{ bases: string; coding: Coding; match: ProteinMatch; issues: Issue[] }> {
    const issues: Issue[] = [];
    const table = body.geneticCode;
    if (!isGeneticCodeId(table)) {
      throw unusable('unknown-genetic-code', 'This genetic code is not offered.', {
        fields: [{ path: 'geneticCode', message: 'Choose one of the codes offered.' }],
      });
    }
    const { bases } = orRefuse(readDna(body.dna), 'dna-unreadable', issues, 'dna');
    const coding = orRefuse(
      readCoding({ bases, circular: body.circular, start: body.codingStart, table }),
      'not-coding',
      issues,
      'codingStart',
    );
    const { protein, preferred } = await this.proteins.numbered(body.proteinId);
    const match = orRefuse(
      matchProtein(coding, protein.residues, {
        bases,
        labelOf: (index) => labelOfResidue(preferred, index) ?? `#${index + 1}`,
      }),
      'protein-not-encoded',
      issues,
      'dna',
    );
    return { bases, coding, match, issues: issues.slice(0, issuesKept) };
  }
}
