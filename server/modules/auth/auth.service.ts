import { IsNull } from 'typeorm';
import type { Person as PersonContract } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { isDuplicate } from '../../lib/database-errors';
import { newId } from '../../lib/new-id';
import { conflict, notFound, Refusal } from '../../lib/problem';
import { hashPassword, passwordFits } from './password';
import { Person } from './person.entity';

export const presentPerson = ({ id, email, name }: Person): PersonContract => ({ id, email, name });

export class AuthService {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async signUp(email: string, name: string, password: string): Promise<Person> {
    const id = newId();
    const passwordHash = await hashPassword(password);
    try {
      return await this.unitOfWork.write({ projectId: null, actorId: id }, async (unit) => {
        const person = unit.manager.create(Person, { id, email, name, passwordHash, createdAt: unit.at });
        await unit.manager.insert(Person, person);
        await unit.audit({ action: 'person.signed-up', subjectKind: 'person', subjectId: id });
        return person;
      });
    } catch (error) {
      if (!isDuplicate(error)) throw error;
      throw conflict(
        'email-taken',
        'This address cannot be used for a new account. If it is yours, sign in.',
        {
          fields: [{ path: 'email', message: 'Sign in with this address, or use another.' }],
        },
      );
    }
  }

  async signIn(email: string, password: string): Promise<Person> {
    const person = await this.unitOfWork.reader.findOneBy(Person, { email, disabledAt: IsNull() });
    if (!(await passwordFits(person?.passwordHash ?? null, password)) || !person) {
      throw new Refusal(401, 'wrong-sign-in', 'Not signed in', 'The address or the password is wrong.');
    }
    return person;
  }

  async read(personId: string): Promise<Person> {
    const person = await this.unitOfWork.reader.findOneBy(Person, { id: personId, disabledAt: IsNull() });
    if (!person) throw notFound('person');
    return person;
  }
}
