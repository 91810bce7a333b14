import { atLeast, type Role } from './roles';

/**
 * Every act in a project and the weakest role that may do it. The server's loaders and the buttons ask this one
 * table. An act on one's own thing may be open to a weaker role (`ownFrom`).
 */
export const rights = {
  'read project': { from: 'reader' },
  export: { from: 'reader' },
  comment: { from: 'contributor' },
  annotate: { from: 'contributor' },
  'edit annotation': { from: 'curator', ownFrom: 'contributor' },
  'contest annotation': { from: 'contributor' },
  'accept annotation': { from: 'curator' },
  'retire annotation': { from: 'curator', ownFrom: 'contributor' },
  plan: { from: 'contributor' },
  upload: { from: 'curator' },
  'confirm map': { from: 'curator' },
  'set numbering': { from: 'curator' },
  'edit family': { from: 'curator' },
  'manage members': { from: 'lead' },
  'change settings': { from: 'lead' },
} as const satisfies Record<string, { from: Role; ownFrom?: Role }>;

export type Act = keyof typeof rights;

export interface Circumstances {
  /** The thing acted on was made by the person who asks. */
  own?: boolean;
  /** The project lets readers comment. */
  readersMayComment?: boolean;
}

export function can(role: Role, act: Act, circumstances: Circumstances = {}): boolean {
  const right: { from: Role; ownFrom?: Role } = rights[act];
  if (act === 'comment' && circumstances.readersMayComment) return true;
  if (circumstances.own && right.ownFrom && atLeast(role, right.ownFrom)) return true;
  return atLeast(role, right.from);
}
