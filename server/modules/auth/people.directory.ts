import { In } from 'typeorm';
import type { PersonBrief } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { Person } from './person.entity';

/** What other modules may know of people. */
export class PeopleDirectory {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async byIds(ids: readonly string[]): Promise<Map<string, Person>> {
    const people = await this.unitOfWork.reader.findBy(Person, { id: In([...new Set(ids)]) });
    return new Map(people.map((person) => [person.id, person]));
  }

  /** Somebody who can sign in. */
  async byEmail(email: string): Promise<Person | null> {
    const person = await this.unitOfWork.reader.findOneBy(Person, { email: email.trim() });
    return person && !person.disabledAt ? person : null;
  }

  async briefs(ids: readonly string[]): Promise<(id: string) => PersonBrief> {
    const people = await this.byIds(ids);
    return (id) => ({ id, name: people.get(id)?.name ?? '' });
  }
}
