import { rightsOf, rolesFromLead, unlistedActs } from '@/features/projects/role-words';

const answers = (role: Parameters<typeof rightsOf>[0], readersMayComment = false) =>
  Object.fromEntries(
    rightsOf(role, readersMayComment).flatMap(({ rights }) => rights.map(({ act, answer }) => [act, answer])),
  );

it('lists every act there is', () => {
  expect(unlistedActs()).toEqual([]);
});

it('lets a lead do everything', () => {
  expect(new Set(Object.values(answers('lead')))).toEqual(new Set(['may']));
});

it('lets a contributor edit and retire only what is their own', () => {
  expect(answers('contributor')).toMatchObject({
    annotate: 'may',
    'edit annotation': 'own',
    'retire annotation': 'own',
    upload: 'may not',
  });
});

it('lets readers comment where the project does', () => {
  expect(answers('reader').comment).toBe('may not');
  expect(answers('reader', true).comment).toBe('may');
});

it('names the strongest role first', () => {
  expect(rolesFromLead).toEqual(['lead', 'curator', 'contributor', 'reader']);
});
