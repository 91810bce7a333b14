import type { Annotation } from '@/shared/contracts/annotations';
import { valuesOf } from '@/features/annotations/annotation-values';
import { evidenceEdge } from '@/features/annotations/evidence-edge';
import { joinContent } from '@/features/annotations/join-content';

const person = { id: '01a2320f-b4b6-7638-92fa-000000000001', name: 'Anouk Verrin' };
const base: Annotation = {
  id: '01a2320f-b4b6-7638-92fa-000000000002',
  shape: 'point',
  status: 'proposed',
  statusReason: '',
  kind: 'note',
  text: 'Carries the ion.',
  confidence: 'medium',
  evidence: [
    { kind: 'coordinates', reference: 'R12' },
    { kind: 'other', reference: 'letter' },
  ],
  pins: [],
  versionNumber: 2,
  by: person,
  at: '2026-11-30T09:00:00.000Z',
  changedBy: person,
  changedAt: '2026-11-30T09:00:00.000Z',
  version: 3,
};

describe('two edits of one statement', () => {
  it('join: each change is taken, evidence that either added stays, what either removed goes', () => {
    const mine = {
      ...valuesOf(base),
      kind: 'ion site' as const,
      evidence: [base.evidence[0] ?? { kind: 'other', reference: '' }, { kind: 'mutant', reference: 'E62Q' }],
    } as ReturnType<typeof valuesOf>;
    const theirs: Annotation = {
      ...base,
      confidence: 'high',
      evidence: [...base.evidence, { kind: 'density', reference: 'map 3' }],
    };
    const { values } = joinContent(base, mine, theirs);
    expect([values.kind, values.confidence]).toEqual(['ion site', 'high']);
    expect(values.evidence.map(({ kind }) => kind)).toEqual(['coordinates', 'density', 'mutant']);
  });
});

describe('the sign of a statement', () => {
  const edge = (...kinds: Annotation['evidence'][number]['kind'][]) =>
    evidenceEdge({ evidence: kinds.map((kind) => ({ kind, reference: '' })) });

  it('is observed only when something was observed, and unsaid when nothing tells', () => {
    expect(edge('calculation', 'density')).toBe('observed');
    expect(edge('conservation', 'publication')).toBe('predicted');
    expect(edge('publication')).toBeNull();
    expect(edge()).toBeNull();
  });
});
