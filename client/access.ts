import type { Person, SessionReply } from '@/shared/contracts/auth';
import { Emitter } from './emitter';

/** What screens know of the session: never the token. */
export type Session =
  | { status: 'restoring' }
  /** The server could not be asked yet; it is asked again by itself. */
  | { status: 'unreachable' }
  | { status: 'signed in'; person: Person }
  /** `expired`: it ran out while somebody worked, so what they typed is kept. */
  | { status: 'signed out'; expired: boolean };

/** Who is signed in, and the access token: in memory only, for one tab. */
export class Access {
  private session: Session = { status: 'restoring' };
  private accessToken: string | null = null;
  private receivedAt = 0;
  private readonly changes = new Emitter<[]>();
  /** Counts acts of signing in and out: what was asked before one of them must not undo it. */
  private count = 0;

  readonly subscribe = this.changes.subscribe;
  readonly read = (): Session => this.session;

  get era(): number {
    return this.count;
  }

  get token(): string | null {
    return this.accessToken;
  }

  get person(): Person | null {
    return this.session.status === 'signed in' ? this.session.person : null;
  }

  /** Seconds since the token came, by the clock of this device alone. */
  get ageSeconds(): number {
    return this.accessToken ? (Date.now() - this.receivedAt) / 1000 : Infinity;
  }

  /** Somebody signs in or out by hand. */
  begin(): void {
    this.count += 1;
  }

  accept({ person, accessToken }: SessionReply): void {
    this.accessToken = accessToken;
    this.receivedAt = Date.now();
    const before = this.person;
    if (before?.id !== person.id || before.name !== person.name || before.email !== person.email) {
      this.change({ status: 'signed in', person });
    }
  }

  /** The renewing token is gone or refused. */
  end(expired: boolean): void {
    this.accessToken = null;
    this.change({ status: 'signed out', expired });
  }

  unreachable(): void {
    if (this.session.status === 'restoring') this.change({ status: 'unreachable' });
  }

  private change(next: Session): void {
    this.session = next;
    this.changes.emit();
  }
}

export const access = new Access();
