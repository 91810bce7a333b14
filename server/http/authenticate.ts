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

/** Short-lived access tokens: signed, with audience and type, checked to the second. */
export class Authenticate {
  constructor(private readonly secret: string) {}

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

  readonly required: RequestHandler = (request, response, next) => {
    const found = /^Bearer ([\w.-]{1,2000})$/.exec(request.get('authorization') ?? '');
    const claims = found?.[1] ? this.verify(found[1]) : null;
    if (!claims)
      throw new Refusal(
        401,
        'sign-in-needed',
        'Sign in',
        'Sign in first, or again: this sign-in has run out.',
      );
    response.locals.personId = claims.personId;
    next();
  };
}
