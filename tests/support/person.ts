// Somebody who uses the product through its API, and what they quickly make there.
import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import type { z } from 'zod';
import {
  auth,
  projects,
  teams,
  uploads,
  type Endpoint,
  type OwnProject,
  type Problem,
  type Upload,
} from '@/shared/contracts';
import type { Role } from '@/shared/permissions';

/** Where it is asked: a server in this process or one of its own. */
type AskedServer = { readonly origin: string };

export interface Answer<T> {
  status: number;
  body: T;
  headers: Headers;
}

interface Input<E extends Endpoint> {
  params?: z.input<E['params']>;
  query?: z.input<E['query']>;
  body?: z.input<E['body']>;
  version?: number;
  key?: string;
  headers?: Record<string, string>;
}

/** Calls an endpoint of the contract, with any token or none; the answer is not judged here. */
export async function ask<E extends Endpoint>(
  origin: string,
  token: string | null,
  endpoint: E,
  input: Input<E> = {},
): Promise<Answer<z.output<E['reply']> & Omit<Partial<Problem>, 'status'>>> {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) =>
    encodeURIComponent(String((input.params as Record<string, unknown> | undefined)?.[name] ?? '')),
  );
  const query = new URLSearchParams(
    Object.entries((input.query ?? {}) as Record<string, unknown>).map(([name, value]) => [
      name,
      String(value),
    ]),
  );
  const hasBody = endpoint.method !== 'GET' && endpoint.encoding === 'json';
  const response = await fetch(`${origin}/api/v1${path}?${query.toString()}`, {
    method: endpoint.method,
    headers: {
      ...(token && { authorization: `Bearer ${token}` }),
      ...(hasBody && { 'content-type': 'application/json' }),
      ...(input.version !== undefined && { 'if-match': `"${input.version}"` }),
      ...(input.key && { 'idempotency-key': input.key }),
      ...input.headers,
    },
    ...(hasBody && { body: JSON.stringify(input.body ?? {}) }),
  });
  const text = await response.text();
  const isJson = response.headers.get('content-type')?.includes('json') ?? false;
  return {
    status: response.status,
    body: (isJson ? JSON.parse(text) : text) as never,
    headers: response.headers,
  };
}

/** Calls and demands that it was done. */
export async function mustAsk<E extends Endpoint>(
  origin: string,
  token: string | null,
  endpoint: E,
  input: Input<E> = {},
): Promise<z.output<E['reply']>> {
  const answer = await ask(origin, token, endpoint, input);
  if (answer.status !== endpoint.status) {
    throw new Error(`${endpoint.name} answered ${answer.status}: ${JSON.stringify(answer.body)}`);
  }
  return answer.body as z.output<E['reply']>;
}

export class TestPerson {
  constructor(
    readonly server: AskedServer,
    readonly id: string,
    readonly email: string,
    readonly token: string,
  ) {}

  ask<E extends Endpoint>(endpoint: E, input: Input<E> = {}) {
    return ask(this.server.origin, this.token, endpoint, input);
  }
  must<E extends Endpoint>(endpoint: E, input: Input<E> = {}) {
    return mustAsk(this.server.origin, this.token, endpoint, input);
  }

  async upload(
    projectId: string,
    fields: Record<string, string>,
    fileName: string,
    bytes: Uint8Array,
    key?: string,
  ) {
    const form = new FormData();
    for (const [name, value] of Object.entries(fields)) form.append(name, value);
    form.append('file', new Blob([bytes as BlobPart]), fileName);
    const response = await fetch(`${this.server.origin}/api/v1/projects/${projectId}/uploads`, {
      method: 'POST',
      headers: { authorization: `Bearer ${this.token}`, ...(key && { 'idempotency-key': key }) },
      body: form,
    });
    return { status: response.status, body: (await response.json()) as Upload & Partial<Problem> };
  }

  /** Uploads a file of tests/fixtures and waits until it is read. */
  async uploadFixture(projectId: string, fields: Record<string, string>, fixture: string): Promise<Upload> {
    const bytes = await readFile(path.join(__dirname, '../fixtures', fixture));
    const { status, body } = await this.upload(projectId, fields, path.basename(fixture), bytes);
    if (status !== 201) throw new Error(`The upload answered ${status}: ${JSON.stringify(body)}`);
    return this.settled(projectId, body.id);
  }

  async settled(projectId: string, uploadId: string): Promise<Upload> {
    for (let tries = 0; tries < 400; tries += 1) {
      const now = await this.must(uploads.read, { params: { projectId, uploadId } });
      if (!['received', 'reading'].includes(now.state)) return now;
      await new Promise((done) => setTimeout(done, 50));
    }
    throw new Error('The upload was not read within 20 seconds.');
  }
}

let count = 0;

export async function signUp(server: AskedServer, name = `Person ${(count += 1)}`): Promise<TestPerson> {
  const email = `${randomUUID()}@lab.example`;
  const body = { email, name, password: 'a long enough password' };
  const { person, accessToken } = await mustAsk(server.origin, null, auth.signUp, { body });
  return new TestPerson(server, person.id, email, accessToken);
}

/** A project with its lead; teams and names make themselves. */
export async function makeProject(lead: TestPerson, name = 'A motor'): Promise<OwnProject> {
  const team = await lead.must(teams.make, { body: { name: 'A team' } });
  return lead.must(projects.make, { body: { teamId: team.id, name, motorKind: 'F' } });
}

export async function addMember(lead: TestPerson, projectId: string, role: Role): Promise<TestPerson> {
  const person = await signUp(lead.server, `The ${role}`);
  await lead.must(projects.addMember, { params: { projectId }, body: { email: person.email, role } });
  return person;
}
