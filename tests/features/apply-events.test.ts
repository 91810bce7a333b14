import fc from 'fast-check';
import { applyEvents, factOf, outOfDate, type Apply, type Fact } from '@/client/facts';
import { applyToAlignment, applyToAlignments } from '@/features/alignments/apply-alignment-event';
import {
  applyToAnnotationsAtResidue,
  applyToAnnotationVersions,
} from '@/features/annotations/apply-annotation-event';
import { applyToAuditPages } from '@/features/audit/apply-audit-event';
import { applyToFamilies, applyToProtein, applyToProteins } from '@/features/families/apply-family-event';
import { applyToMutant, applyToMutants } from '@/features/plans/apply-plan-event';
import { applyToMembers, applyToOwnProject, applyToProjects } from '@/features/projects/apply-project-event';
import { applyToLocated, applyToPassport } from '@/features/residues/apply-residue-event';
import { applyToStructure, applyToStructures } from '@/features/structures/apply-structure-event';
import {
  applyToThreadOfSubject,
  applyToThreadPages,
  mergeThread,
  prependEarlier,
  type SubjectThread,
} from '@/features/threads/apply-thread-event';
import { applyToUpload, applyToUploads, withHint } from '@/features/uploads/apply-upload-event';
import type { Member, OwnProject, Passport } from '@/shared/contracts';
import {
  alignment,
  annotation,
  chainMap,
  family,
  idOf,
  label,
  message,
  mutant,
  protein,
  structure,
  thread,
  threadKey,
  upload,
} from '../client/support/contract-values';

const here = { proteinId: idOf(1), residueIndex: 58 };
const fact = <Kind extends Fact['kind']>(kind: Kind, payload: Extract<Fact, { kind: Kind }>['payload']) =>
  ({ kind, payload }) as Fact;

describe('uploads', () => {
  test('the newest stands first, and a late older state changes nothing', () => {
    const list = applyToUploads([upload()], fact('upload.changed', upload({ id: idOf(11) })));
    expect(list.map(({ id }) => id)).toEqual([idOf(11), idOf(10)]);
    const done = upload({ state: 'done', version: 3 });
    const after = applyToUploads(list, fact('upload.changed', done));
    expect(applyToUploads(after, fact('upload.changed', upload({ version: 2 })))).toBe(after);
    expect(applyToUpload(upload(), fact('upload.changed', done))).toEqual(done);
  });

  test('a hint shows how far the reading is, and says nothing once it is read', () => {
    const hint = { stage: 'Matching chains', done: 17, total: 32 };
    expect(withHint(upload(), hint)).toMatchObject(hint);
    const done = upload({ state: 'done' });
    expect(withHint(done, hint)).toBe(done);
  });
});

describe('projects and members', () => {
  const own: OwnProject = {
    id: idOf(7),
    teamId: idOf(8),
    teamName: 'Ring group',
    name: 'Ring',
    motorKind: 'F',
    readersMayComment: false,
    invented: true,
    version: 1,
    role: 'reader',
    head: 4,
  };
  const member = (person: number, role: Member['role'], since = '2026-01-01T00:00:00.000Z'): Member => ({
    personId: idOf(person),
    name: `Person ${person}`,
    email: `p${person}@lab.example`,
    role,
    since,
  });

  test('a change of settings keeps one’s own role; a change of role is one’s own only when it names oneself', () => {
    const { role: _role, head: _head, ...settings } = { ...own, name: 'Ring and head', version: 2 };
    const renamed = applyToOwnProject(own, fact('project.changed', settings), idOf(1));
    expect(renamed).toEqual({ ...own, name: 'Ring and head', version: 2 });
    expect(applyToOwnProject(own, fact('member.changed', member(1, 'lead')), idOf(1)).role).toBe('lead');
    expect(applyToOwnProject(own, fact('member.changed', member(2, 'lead')), idOf(1))).toBe(own);
  });

  test('the role changes in the project the event is of, and a project one was removed from goes', () => {
    const other = { ...own, id: idOf(9) };
    const list = applyToProjects([own, other], fact('member.changed', member(1, 'lead')), own.id, idOf(1));
    expect(list.map(({ role }) => role)).toEqual(['lead', 'reader']);
    const removed = fact('member.removed', { personId: idOf(1) });
    expect(applyToProjects(list, removed, own.id, idOf(1))).toEqual([other]);
    expect(applyToProjects(list, removed, own.id, idOf(2))).toBe(list);
  });

  test('members stand in the order in which they came', () => {
    const first = [member(5, 'lead', '2026-01-02T00:00:00.000Z')];
    const two = applyToMembers(first, fact('member.added', member(3, 'reader', '2026-01-03T00:00:00.000Z')));
    expect(two).toMatchObject([{ personId: idOf(5) }, { personId: idOf(3) }]);
    const lead = member(3, 'lead', '2026-01-03T00:00:00.000Z');
    expect(applyToMembers(two as Member[], fact('member.changed', lead))).toEqual([...first, lead]);
    expect(applyToMembers(two as Member[], fact('member.removed', { personId: idOf(3) }))).toEqual(first);
    expect(applyToMembers(first, fact('member.changed', { ...first[0]! }))).toBe(first);
  });
});

describe('families and proteins', () => {
  test('families stand by their sort, and are read again when proteins may have come', () => {
    const list = applyToFamilies(
      [family()],
      fact('family.changed', family({ id: idOf(3), name: 'a', sort: 0 })),
    );
    expect(list).toMatchObject([{ name: 'a' }, { name: 'c' }]);
    expect(applyToFamilies([family()], fact('alignment.changed', alignment()))).toBe(outOfDate);
    expect(applyToFamilies([family()], fact('protein.changed', protein()))).toBe(outOfDate);
    const held = [family()];
    expect(applyToFamilies(held, fact('protein.changed', protein({ version: 2 })))).toBe(held);
  });

  test('a renamed protein is renamed in the list of its family only', () => {
    const { residues: _r, numberings: _n, preferredNumbering: _p, ...brief } = protein();
    const renamed = fact('protein.changed', protein({ organism: 'Aquatilis nova', version: 2 }));
    expect(applyToProteins([brief], renamed, idOf(2))).toEqual([
      { ...brief, organism: 'Aquatilis nova', version: 2 },
    ]);
    const elsewhere = [{ ...brief, familyId: idOf(3) }];
    expect(applyToProteins(elsewhere, renamed, idOf(3))).toBe(elsewhere);
  });

  test('the preferred numbering is the family’s, so a changed family has its proteins read again', () => {
    expect(applyToProtein(protein(), fact('family.changed', family()))).toBe(outOfDate);
    const held = protein();
    expect(applyToProtein(held, fact('family.changed', family({ id: idOf(3) })))).toBe(held);
  });
});

describe('alignments', () => {
  const rows = [{ rowIndex: 0, name: 'r', proteinId: idOf(1), organism: 'Aquatilis marna', text: 'ME-L' }];
  test('a new revision has its rows read again, anything else is patched', () => {
    const held = { ...alignment(), rows };
    const renamed = fact('alignment.changed', alignment({ name: 'c, mended', version: 2 }));
    expect(applyToAlignment(held, renamed)).toEqual({ ...held, name: 'c, mended', version: 2 });
    const revised = fact('alignment.changed', alignment({ revisionId: idOf(22), revision: 2, version: 2 }));
    expect(applyToAlignment(held, revised)).toBe(outOfDate);
    expect(applyToAlignment(held, fact('alignment.changed', alignment()))).toBe(held);
  });

  test('which one is the reference is the family’s to say', () => {
    const list = [alignment(), alignment({ id: idOf(19), isReference: false })];
    const chosen = (id: string) => fact('family.changed', family({ referenceAlignmentId: id, version: 2 }));
    expect(applyToAlignments(list, chosen(idOf(19)))).toBe(outOfDate);
    expect(applyToAlignments(list, chosen(idOf(20)))).toBe(list);
    expect(applyToAlignment({ ...alignment(), rows }, chosen(idOf(19)))).toBe(outOfDate);
  });

  test('the newest stands first', () => {
    const newer = fact('alignment.changed', alignment({ id: idOf(29), isReference: false }));
    expect(applyToAlignments([alignment()], newer)).toMatchObject([{ id: idOf(29) }, { id: idOf(20) }]);
  });
});

describe('structures and maps', () => {
  const held = { ...structure(), chains: [chainMap(), chainMap({ chainId: idOf(41), authorId: 'L' })] };
  const decided = chainMap({ status: 'confirmed', readiness: 'none', version: 2 });

  test('a decision stands on its chain and one fewer waits; said twice it is the same', () => {
    const after = applyToStructure(held, fact('map.decided', decided));
    expect(after).toEqual({ ...held, chains: [decided, held.chains[1]], waiting: 1 });
    expect(applyToStructure(after as typeof held, fact('map.decided', decided))).toBe(after);
  });

  test('how many chains wait is told without a new version, and the last word counts', () => {
    const fewer = structure({ waiting: 0 });
    expect(applyToStructures([structure()], fact('structure.changed', fewer))).toEqual([fewer]);
    const newer = [structure({ version: 2, waiting: 0 })];
    expect(applyToStructures(newer, fact('structure.changed', structure()))).toBe(newer);
  });

  test('a renamed protein has the chains that name it read again, a new one does not', () => {
    expect(applyToStructure(held, fact('protein.changed', protein({ version: 2 })))).toBe(outOfDate);
    expect(applyToStructure(held, fact('protein.changed', protein()))).toBe(held);
  });
});

describe('the residue', () => {
  const passport: Passport = {
    residue: label(),
    proteinName: 'c',
    proteinLength: 80,
    familyVersion: 1,
    labels: [],
    column: null,
    equivalents: [],
    gaps: [],
    copies: [],
    previous: null,
    next: null,
    pinnedIndices: [],
  };

  test('its passport is read again when a numbering, alignment, map or pin of it changed, else not', () => {
    const touching = [
      fact('protein.changed', protein({ version: 2 })),
      fact('family.changed', family()),
      fact('alignment.changed', alignment()),
      fact('map.decided', chainMap()),
      fact('annotation.changed', annotation()),
    ];
    for (const one of touching) expect(applyToPassport(passport, one)).toBe(outOfDate);
    const apart = [
      fact('alignment.changed', alignment({ familyId: idOf(3) })),
      fact('map.decided', chainMap({ proteinId: idOf(9) })),
      fact('annotation.changed', annotation({ pins: [] })),
      fact('message.posted', { message: message(1), thread: thread(1) }),
      fact('upload.changed', upload()),
    ];
    for (const one of apart) expect(applyToPassport(passport, one)).toBe(passport);
  });

  test('found addresses are read again when their pins or what they mean may have changed', () => {
    const reading = {
      group: 'c',
      spelling: 'cE59',
      reason: '',
      mismatch: null,
      mutationTo: null,
      pinCount: 0,
    };
    const located = {
      text: 'cE59',
      readings: [{ residue: label(), ...reading }],
      notReadAs: [],
      more: false,
    };
    expect(applyToLocated(located, fact('annotation.changed', annotation()))).toBe(outOfDate);
    expect(applyToLocated(located, fact('annotation.changed', annotation({ pins: [] })))).toBe(located);
    expect(applyToLocated(located, fact('map.decided', chainMap()))).toBe(outOfDate);
  });
});

describe('annotations', () => {
  const apply: Apply<Parameters<typeof applyToAnnotationsAtResidue>[0]> = (list, one) =>
    applyToAnnotationsAtResidue(list, one, here);
  const via = { residue: label({ proteinId: idOf(5) }), grade: 'good' as const };

  test('one pinned here is added before those by equivalence, the newest first', () => {
    const distant = { ...annotation({ id: idOf(59) }), viaEquivalence: via };
    const older = { ...annotation({ id: idOf(49) }), viaEquivalence: null };
    const list = apply([older, distant], fact('annotation.changed', annotation()), '');
    expect((list as (typeof older)[]).map(({ id }) => id)).toEqual([idOf(50), idOf(49), idOf(59)]);
  });

  test('an edited one keeps how it came here', () => {
    const distant = { ...annotation({ pins: [] }), viaEquivalence: via };
    const edited = annotation({ pins: [], text: 'Mended.', versionNumber: 2, version: 2 });
    expect(apply([distant], fact('annotation.changed', edited), '')).toEqual([
      { ...edited, viaEquivalence: via },
    ]);
  });

  test('a new one pinned elsewhere may hold here by equivalence: the list is read again', () => {
    const elsewhere = { ...label({ residueIndex: 3 }), structureId: null, chains: null };
    expect(apply([], fact('annotation.changed', annotation({ pins: [elsewhere] })), '')).toBe(outOfDate);
    const list: [] = [];
    expect(apply(list, fact('annotation.changed', annotation({ pins: [elsewhere], version: 2 })), '')).toBe(
      list,
    );
  });

  test('a new text is a new version, a new status is none', () => {
    const first = applyToAnnotationVersions([], fact('annotation.changed', annotation()), idOf(50));
    expect(first).toMatchObject([{ number: 1, text: 'Carries the ion.' }]);
    const accepted = annotation({ status: 'accepted', version: 2 });
    expect(applyToAnnotationVersions(first, fact('annotation.changed', accepted), idOf(50))).toBe(first);
    const edited = annotation({ text: 'Mended.', versionNumber: 2, version: 3 });
    const two = applyToAnnotationVersions(first, fact('annotation.changed', edited), idOf(50));
    expect(two.map(({ number }) => number)).toEqual([2, 1]);
  });
});

describe('threads', () => {
  const empty: SubjectThread = {
    thread: null,
    caption: 'c E59',
    residue: label(),
    messages: [],
    earlier: null,
  };
  const posted = (number: number) =>
    fact('message.posted', { message: message(number), thread: thread(number) });
  const take = (view: SubjectThread, one: Fact) =>
    applyToThreadOfSubject(view, one, threadKey) as SubjectThread;

  test('messages stand in the order of their numbers, each once, however they arrive', () => {
    fc.assert(
      fc.property(
        fc.shuffledSubarray([1, 2, 3, 5, 8, 9], { minLength: 6 }),
        fc.array(fc.nat(5)),
        (order, again) => {
          const numbers = [...order, ...again.map((at) => order[at] ?? 1)];
          const view = numbers.map(posted).reduce(take, empty);
          expect(view.messages.map(({ eventNumber }) => eventNumber)).toEqual([1, 2, 3, 5, 8, 9]);
          expect(view.thread?.lastMessage?.eventNumber).toBe(9);
        },
      ),
    );
  });

  test('a message of another subject changes nothing', () => {
    const other = fact('message.posted', {
      message: message(4),
      thread: thread(4, { subjectKey: 'mutant:x' }),
    });
    expect(take(empty, other)).toBe(empty);
  });

  test('an answer that brings the newest part joins what was read before; a hole drops the older part', () => {
    const part = (from: number, to: number, earlier: number | null): SubjectThread => ({
      ...empty,
      thread: thread(to),
      messages: Array.from({ length: to - from + 1 }, (_, at) => message(from + at)),
      earlier,
    });
    const held = prependEarlier(part(5, 8, 5), part(2, 4, 2));
    expect(held.messages.map(({ eventNumber }) => eventNumber)).toEqual([2, 3, 4, 5, 6, 7, 8]);
    const joined = mergeThread(held, part(7, 10, 7));
    expect(joined.messages.map(({ eventNumber }) => eventNumber)).toEqual([2, 3, 4, 5, 6, 7, 8, 9, 10]);
    expect(joined.earlier).toBe(2);
    const far = part(20, 22, 20);
    expect(mergeThread(held, far)).toBe(far);
  });

  test('the thread spoken in last comes first, on whichever page it was', () => {
    const named = (id: number, last: number) => thread(last, { id: idOf(id), subjectKey: `mutant:${id}` });
    const pages = [
      { threads: [named(61, 9)], next: 9 },
      { threads: [named(62, 4)], next: null },
    ];
    const spoken = fact('message.posted', { message: message(12), thread: named(62, 12) });
    const after = applyToThreadPages(pages, spoken);
    expect(after).toMatchObject([
      { threads: [{ id: idOf(62) }, { id: idOf(61) }], next: 9 },
      { threads: [] },
    ]);
    expect(applyToThreadPages(after as typeof pages, spoken)).toBe(after);
  });
});

describe('plans', () => {
  test('a mutant joins the lists it fits, newest first', () => {
    const newer = fact('mutant.changed', mutant({ id: idOf(71) }));
    const list = applyToMutants([mutant()], newer, here) as { id: string }[];
    expect(list.map(({ id }) => id)).toEqual([idOf(71), idOf(70)]);
    const elsewhere = [mutant()];
    expect(applyToMutants(elsewhere, newer, { proteinId: idOf(9) })).toBe(elsewhere);
    expect(applyToMutant(mutant({ version: 2 }), fact('mutant.changed', mutant()))).toMatchObject({
      version: 2,
    });
  });
});

test('another preferred numbering has everything read again that shows a label of the family', () => {
  const renumbered = fact('family.changed', family({ version: 2 }));
  const pinned = [{ ...annotation(), viaEquivalence: null }];
  expect(applyToAnnotationsAtResidue(pinned, renumbered, here)).toBe(outOfDate);
  expect(applyToMutants([mutant()], renumbered)).toBe(outOfDate);
  expect(applyToThreadPages([{ threads: [thread(1)], next: null }], renumbered)).toBe(outOfDate);
});

test('an event of a kind or shape this page does not know is no fact: what is held is read again', () => {
  expect(factOf({ kind: 'copy.counted', payload: {} })).toBeNull();
  expect(factOf({ kind: 'toString', payload: {} })).toBeNull();
  expect(factOf({ kind: 'upload.changed', payload: { id: 1 } })).toBeNull();
  const event = {
    projectId: idOf(7),
    eventNumber: 1,
    kind: 'copy.counted',
    subjectId: '',
    actor: { id: idOf(1), name: '' },
    at: '2026-01-01T00:00:00.000Z',
    payload: {},
  };
  expect(applyEvents([upload()], [event], applyToUploads)).toBe(outOfDate);
  expect(applyToAuditPages([])).toBe(outOfDate);
});
