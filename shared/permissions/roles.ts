/** Roles of a project, weakest first; each also has the rights of those before it. */
export const roles = ['reader', 'contributor', 'curator', 'lead'] as const;
export type Role = (typeof roles)[number];

export function atLeast(role: Role, needed: Role): boolean {
  return roles.indexOf(role) >= roles.indexOf(needed);
}
