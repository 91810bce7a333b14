import type { PersonBrief } from '../../shared/contracts';

/** Who has a project open, by socket. Nothing of it is stored: a server that starts anew learns it again from joins. */
export class Presence {
  private readonly projects = new Map<string, Map<string, PersonBrief>>();

  /** True when somebody new is here. */
  add(projectId: string, socketId: string, person: PersonBrief): void {
    const here = this.projects.get(projectId) ?? new Map<string, PersonBrief>();
    here.set(socketId, person);
    this.projects.set(projectId, here);
  }

  remove(projectId: string, socketId: string): void {
    const here = this.projects.get(projectId);
    here?.delete(socketId);
    if (here?.size === 0) this.projects.delete(projectId);
  }

  projectsOf(socketId: string): string[] {
    return [...this.projects].filter(([, here]) => here.has(socketId)).map(([projectId]) => projectId);
  }

  /** Each person once, however many tabs. */
  people(projectId: string): PersonBrief[] {
    const people = new Map<string, PersonBrief>();
    for (const person of this.projects.get(projectId)?.values() ?? []) people.set(person.id, person);
    return [...people.values()].sort((one, other) => one.name.localeCompare(other.name));
  }

  get open(): string[] {
    return [...this.projects.keys()];
  }
}
