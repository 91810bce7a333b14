// A server process on a database and a folder of its own, with a project in it that holds one family's proteins.
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import mysql, { type Connection, type RowDataPacket } from 'mysql2/promise';
import { families, projects, type ProjectEvent, type Subject } from '@/shared/contracts';
import { createFreshDatabase, type FreshDatabase } from '@/tests/support/fresh-database';
import { addMember, makeProject, signUp, type TestPerson } from '@/tests/support/person';
import { startServerProcess, type ServerProcess } from '@/tests/support/server-process';

export interface Workbench {
  server: ServerProcess;
  database: FreshDatabase;
  dataDir: string;
  /** Rows straight from the database, whatever the server thinks. */
  rows<Row>(sql: string, values?: unknown[]): Promise<Row[]>;
  close(): Promise<void>;
}

/** `database`: one that is there already; else an empty one that is dropped in the end. */
export async function openWorkbench(
  settings: Record<string, string> = {},
  database?: FreshDatabase,
): Promise<Workbench> {
  const own = database ?? (await createFreshDatabase());
  const dataDir = await mkdtemp(path.join(tmpdir(), 'locant-faults-'));
  const server = await startServerProcess({ databaseUrl: own.url, dataDir, settings });
  return {
    server,
    database: own,
    dataDir,
    async rows<Row>(sql: string, values: unknown[] = []) {
      const connection: Connection = await mysql.createConnection({ uri: own.url, timezone: 'Z' });
      try {
        const [found] = await connection.query<RowDataPacket[]>(sql, values);
        return found as unknown as Row[];
      } finally {
        await connection.end();
      }
    },
    async close() {
      await server.stop();
      await own.drop();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}

export interface SharedProject {
  projectId: string;
  lead: TestPerson;
  contributor: TestPerson;
  familyId: string;
  proteinId: string;
  subjectAt(residueIndex: number): Subject;
}

/** A project of two people with the c family's alignment in it. */
export async function shareProject(server: ServerProcess): Promise<SharedProject> {
  const lead = await signUp(server, 'The lead');
  const { id: projectId } = await makeProject(lead);
  const contributor = await addMember(lead, projectId, 'contributor');
  const list = await lead.must(families.list, { params: { projectId } });
  const familyId = list.find((family) => family.name === 'c')?.id ?? '';
  await lead.uploadFixture(projectId, { kind: 'alignment', familyId }, 'alignments/c_small_mafft.afa');
  const [protein] = await lead.must(families.proteins, { params: { projectId, familyId } });
  if (!protein) throw new Error('The alignment brought no protein.');
  const proteinId = protein.id;
  const subjectAt = (residueIndex: number): Subject => ({ kind: 'residue', proteinId, residueIndex });
  return { projectId, lead, contributor, familyId, proteinId, subjectAt };
}

/** All events after one, as a client that was away asks for them. */
export async function eventsAfter(
  person: TestPerson,
  projectId: string,
  first: number,
): Promise<ProjectEvent[]> {
  const all: ProjectEvent[] = [];
  for (let after = first; ;) {
    const reply = await person.must(projects.events, { params: { projectId }, query: { after } });
    if (reply.readAfresh) throw new Error('The server asks to read afresh.');
    all.push(...reply.events);
    after = all.at(-1)?.eventNumber ?? after;
    if (reply.events.length === 0 || after >= reply.head) return all;
  }
}
