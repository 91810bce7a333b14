import type { RequestHandler } from 'express';
import jwt from 'jsonwebtoken';
import { Refusal } from '../lib/problem';

const audience = 'locant';
const algorithm = 'HS256';
export const accessTokenSeconds = 600;

export interface AccessClaims {
  personId: string;
  /** The family of renewing tokens it came from: when that is revoked, sockets are cut. */
  sessionFamilyId: string;
  expiresAt: Date;
}

/** A sign-in that ended is noticed within this time, in whichever process it ended. */
const trustedMilliseconds = 1000;
const sessionsRemembered = 10_000;

/** Short-lived access tokens: signed, with audience and type, checked to the second, good while the sign-in lasts. */
export class Authenticate {
  private readonly openUntil = new Map<string, number>();

  constructor(
    private readonly secret: string,
    /** Whether the family of renewing tokens an access token came from still lasts. */
    private readonly lasts: (sessionFamilyId: string) => Promise<boolean>,
  ) {}

  issue(personId: string, sessionFamilyId: string, now = new Date()): { token: string; expiresAt: Date } {
    const issued = Math.floor(now.getTime() / 1000);
    const expires = issued + accessTokenSeconds;
    const token = jwt.sign({ typ: 'access', fam: sessionFamilyId, iat: issued, exp: expires }, this.secret, {
      algorithm,
      audience,
      subject: personId,
    });
    return { token, expiresAt: new Date(expires * 1000) };
  }

  /** The claims of a good token, or null for any other. */
  verify(token: string): AccessClaims | null {
    try {
      const claims = jwt.verify(token, this.secret, { algorithms: [algorithm], audience, clockTolerance: 0 });
      if (typeof claims === 'string' || claims.typ !== 'access' || !claims.sub || !claims.exp) return null;
      return {
        personId: claims.sub,
        sessionFamilyId: String(claims.fam),
        expiresAt: new Date(claims.exp * 1000),
      };
    } catch {
      return null;
    }
  }

  /** The sign-in ended here: its access tokens end with it. */
  forget(sessionFamilyId: string): void {
    this.openUntil.delete(sessionFamilyId);
  }

  readonly required: RequestHandler = async (request, response, next) => {
    const found = /^Bearer ([\w.-]{1,2000})$/.exec(request.get('authorization') ?? '');
    const claims = found?.[1] ? this.verify(found[1]) : null;
    if (!claims || !(await this.isOpen(claims.sessionFamilyId)))
      throw new Refusal(
        401,
        'sign-in-needed',
        'Sign in',
        'Sign in first, or again: this sign-in has run out.',
      );
    response.locals.personId = claims.personId;
    next();
  };

  private async isOpen(sessionFamilyId: string): Promise<boolean> {
    const now = Date.now();
    if ((this.openUntil.get(sessionFamilyId) ?? 0) > now) return true;
    if (!(await this.lasts(sessionFamilyId))) return false;
    if (this.openUntil.size >= sessionsRemembered) this.openUntil.clear();
    this.openUntil.set(sessionFamilyId, now + trustedMilliseconds);
    return true;
  }
}
