import type { Request, Response } from 'express';
import { auth, type SessionReply } from '../../../shared/contracts';
import { originAllowed, type Authenticate, type Routes } from '../../http';
import { Refusal } from '../../lib/problem';
import { presentPerson, type AuthService } from './auth.service';
import type { Person } from './person.entity';
import type { OpenSession, SessionService } from './session.service';
import type { SignInLimit } from './sign-in-limit';

const cookieName = 'locant_session';
const cookiePath = '/api/v1/auth';

const tokenOf = (request: Request): string | null =>
  new RegExp(`(?:^|;\\s*)${cookieName}=([\\w-]{20,100})`).exec(request.headers.cookie ?? '')?.[1] ?? null;

interface Parts {
  authenticate: Authenticate;
  service: AuthService;
  sessions: SessionService;
  limit: SignInLimit;
  allowedOrigins: readonly string[];
  /** Told when a sign-in ends, so that its sockets are cut. */
  onClosed: (sessionFamilyId: string) => void;
}

export function addAuthRoutes(routes: Routes, parts: Parts): void {
  const { authenticate, service, sessions, limit } = parts;
  // The cookie travels by itself, so a request that carries it must come from our own pages.
  const ownPage = (request: Request) => {
    if (!originAllowed(request, parts.allowedOrigins)) {
      throw new Refusal(
        403,
        'foreign-page',
        'Not allowed',
        'Sign-in works from this product’s own pages only.',
      );
    }
  };
  const setCookie = (request: Request, response: Response, session: OpenSession | null) =>
    response.cookie(cookieName, session?.token ?? '', {
      httpOnly: true,
      sameSite: 'strict',
      secure: request.secure,
      path: cookiePath,
      expires: session?.expiresAt ?? new Date(0),
    });
  const reply = (
    request: Request,
    response: Response,
    person: Person,
    session: OpenSession,
  ): SessionReply => {
    setCookie(request, response, session);
    const access = authenticate.issue(person.id, session.familyId);
    return {
      person: presentPerson(person),
      accessToken: access.token,
      expiresAt: access.expiresAt.toISOString(),
    };
  };

  routes.add(auth.signUp, async ({ body, request, response }) => {
    ownPage(request);
    await limit.take(request, body.email);
    const person = await service.signUp(body.email, body.name, body.password);
    return reply(request, response, person, await sessions.open(person.id));
  });
  routes.add(auth.signIn, async ({ body, request, response }) => {
    ownPage(request);
    await limit.take(request, body.email);
    const person = await service.signIn(body.email, body.password);
    return reply(request, response, person, await sessions.open(person.id));
  });
  routes.add(auth.renew, async ({ request, response }) => {
    ownPage(request);
    const token = tokenOf(request);
    const renewal = token ? await sessions.renew(token) : null;
    if (renewal && 'endedFamilyId' in renewal) parts.onClosed(renewal.endedFamilyId);
    if (!renewal || !('session' in renewal)) {
      throw new Refusal(401, 'sign-in-needed', 'Sign in', 'Sign in again: this sign-in has ended.');
    }
    return reply(request, response, await service.read(renewal.session.personId), renewal.session);
  });
  routes.add(auth.signOut, async ({ request, response }) => {
    ownPage(request);
    const token = tokenOf(request);
    const familyId = token ? await sessions.close(token) : null;
    if (familyId) parts.onClosed(familyId);
    setCookie(request, response, null);
    return {};
  });
  routes.add(auth.me, async ({ personId }) => presentPerson(await service.read(personId)));
}
