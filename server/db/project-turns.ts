/**
 * Units of one project wait for each other here, before they take a connection: a busy project would otherwise hold
 * every connection of the pool while its units wait for the project's lock in the database.
 */
export class ProjectTurns {
  private readonly last = new Map<string, Promise<unknown>>();

  take<T>(projectId: string | null, work: () => Promise<T>): Promise<T> {
    if (projectId === null) return work();
    const before = this.last.get(projectId) ?? Promise.resolve();
    const turn = before.then(work, work);
    this.last.set(projectId, turn);
    const forget = () => {
      if (this.last.get(projectId) === turn) this.last.delete(projectId);
    };
    void turn.then(forget, forget);
    return turn;
  }
}
