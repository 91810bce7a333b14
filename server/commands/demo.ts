import { Readable } from 'node:stream';
import { makeScenario, type Scenario, type ScenarioResidue } from '../../shared/scenario/scenario';
import type { Container } from '../container';
import { AuditEntry } from '../db/entities';
import type { Env } from '../env';
import { newId } from '../lib/new-id';
import { withRequestContext } from '../lib/request-context';
import { Family, Protein } from '../modules/families';
import { ProjectMember } from '../modules/projects';
import { TeamMember } from '../modules/teams';

const loadedMark = 'demo.loaded';

/** Loads the invented scenario through the same services that people use, once. */
export async function loadDemoOnce(container: Container, env: Env): Promise<void> {
  const { reader } = container.unitOfWork;
  if (await reader.existsBy(AuditEntry, { action: loadedMark })) return;
  if (!env.DEMO_PASSWORD) throw new Error('DEMO_PASSWORD is needed to make the demo accounts.');
  console.log('Loading the demo, an invented consortium; this happens once.');
  await new DemoLoader(container, makeScenario()).load(env.DEMO_PASSWORD);
}

/** What the start prints for whoever wants to look around. */
export function demoNote(env: Env): string {
  const lines = makeScenario().people.map(
    ({ name, email, role }) => `  ${email.padEnd(34)} ${role.padEnd(12)} ${name}`,
  );
  const open = env.HOST === '127.0.0.1' || env.HOST === 'localhost';
  const warning = open ? '' : '\nThis address is open to your network, and the demo accounts are too.';
  return `\nDemo accounts (invented data), all with the password ${env.DEMO_PASSWORD}:\n${lines.join('\n')}${warning}\n`;
}

class DemoLoader {
  private readonly ids = new Map<string, string>();

  constructor(
    private readonly container: Container,
    private readonly scenario: Scenario,
  ) {}

  async load(password: string): Promise<void> {
    const { people, team, project } = this.scenario;
    for (const person of people) {
      // A load that was cut off left its people; everything else is made anew.
      const known = await this.container.people.byEmail(person.email);
      const { id } = known ?? (await this.container.authService.signUp(person.email, person.name, password));
      this.ids.set(person.key, id);
    }
    const lead = people.find((person) => person.teamLead)?.key ?? people[0]?.key ?? '';
    await this.forgetHalfLoaded();
    const made = await this.as(lead, async (id) => {
      const madeTeam = await this.container.teamService.make(id, team.name);
      const { name, motorKind } = project;
      return this.container.projectService.make(id, { teamId: madeTeam.id, name, motorKind }, true);
    });
    for (const person of people.filter(({ key }) => key !== lead)) {
      await this.as(lead, (id) =>
        this.container.projectService.addMember(id, made.id, person.email, person.role),
      );
    }
    const curator = people.find((person) => person.role === 'curator')?.key ?? lead;
    await this.files(made.id, curator);
    await this.story(made.id, curator);
    await this.as(lead, () =>
      this.container.unitOfWork.write({ projectId: made.id }, (unit) =>
        unit.audit({ action: loadedMark, subjectKind: 'project', subjectId: made.id }),
      ),
    );
  }

  /** Acts as one of the invented people. */
  private as<T>(key: string, act: (personId: string) => Promise<T>): Promise<T> {
    const actorId = this.ids.get(key);
    if (!actorId) throw new Error(`The scenario has nobody called ${key}.`);
    return withRequestContext({ requestId: 'demo', actorId, clientRequest: null }, () => act(actorId));
  }

  /** Nobody sees what a start that was cut off left; no real person had a way in before the demo was whole. */
  private async forgetHalfLoaded(): Promise<void> {
    const ids = [...this.ids.values()];
    const [actorId] = ids;
    if (!actorId) return;
    await this.container.unitOfWork.write({ projectId: null, actorId }, async (unit) => {
      for (const personId of ids) {
        await unit.manager.delete(ProjectMember, { personId });
        await unit.manager.delete(TeamMember, { personId });
      }
    });
  }

  private async files(projectId: string, curator: string): Promise<void> {
    const { alignments, structure, story } = this.scenario;
    const families = await this.container.unitOfWork.reader.findBy(Family, { projectId });
    for (const { family, fileName, text } of alignments) {
      const familyId = families.find((one) => one.name === family)?.id;
      if (!familyId) throw new Error(`The project has no family ${family}.`);
      const name = `${family}, ten organisms`;
      await this.upload(projectId, curator, { kind: 'alignment', familyId, name }, fileName, text);
    }
    for (const numbering of story.numberings) {
      const { proteinId } = await this.residue(projectId, {
        ...numbering,
        index: 0 as ScenarioResidue['index'],
      });
      const protein = await this.container.familyQueries.protein(
        await this.container.proteins.mustFind(projectId, proteinId),
      );
      const { name, offset } = numbering;
      await this.as(curator, (id) =>
        this.container.proteinService.setOffsetNumbering(id, projectId, proteinId, protein.version, {
          name,
          offset,
          skipZero: false,
          preferred: true,
        }),
      );
    }
    const name = 'ring and stator model';
    const read = await this.upload(
      projectId,
      curator,
      { kind: 'structure', name },
      structure.fileName,
      structure.text,
    );
    await this.as(curator, (id) =>
      this.container.mapService.confirmReady(id, projectId, read.structureId ?? ''),
    );
  }

  private async upload(
    projectId: string,
    curator: string,
    body: { kind: 'alignment' | 'structure'; familyId?: string; name: string },
    fileName: string,
    text: string,
  ) {
    const received = await this.container.files.receive(Readable.from([Buffer.from(text)]));
    const made = await this.as(curator, (id) =>
      this.container.uploadService.make(id, projectId, body, { ...received, fileName }),
    );
    for (let tries = 0; tries < 600; tries += 1) {
      const now = await this.container.uploadQueries.read(projectId, made.id);
      if (now.state === 'done' || now.state === 'waiting') return now;
      if (now.state === 'refused')
        throw new Error(`${fileName}: ${now.issues.map((one) => one.message).join(' ')}`);
      await new Promise((done) => setTimeout(done, 100));
    }
    throw new Error(`${fileName} was not read.`);
  }

  private async residue(projectId: string, { family, organism, index }: ScenarioResidue) {
    const { reader } = this.container.unitOfWork;
    const { id: familyId } = await reader.findOneByOrFail(Family, { projectId, name: family });
    const name = organism.replace(/ /g, '_');
    const proteins = await reader.findBy(Protein, { familyId });
    const protein = proteins.find(
      (one) => one.organism === organism || one.organism === name || one.name === name,
    );
    if (!protein) throw new Error(`There is no ${family} of ${organism}.`);
    return { proteinId: protein.id, residueIndex: Number(index) };
  }

  private async story(projectId: string, curator: string): Promise<void> {
    const { annotations, threads, mutants } = this.scenario.story;
    const { annotationService, threadService } = this.container;
    for (const told of annotations) {
      const { kind, text, confidence, evidence } = told;
      const pins = await Promise.all(told.residues.map((residue) => this.residue(projectId, residue)));
      const made = await this.as(told.author, (id) =>
        annotationService.make(id, projectId, { pins, kind, text, confidence, evidence }),
      );
      if (told.status === 'proposed') continue;
      const change = { status: told.status, reason: told.reason ?? '' };
      await this.as(told.decidedBy ?? curator, (id) =>
        annotationService.setStatus(id, projectId, made.id, made.version, change),
      );
    }
    for (const thread of threads) {
      const subject = { kind: 'residue' as const, ...(await this.residue(projectId, thread.residue)) };
      for (const { author, text } of thread.messages) {
        await this.as(author, (id) =>
          threadService.post(id, projectId, { clientKey: newId(), subject, text }),
        );
      }
    }
    const constructId = await this.construct(projectId, curator);
    for (const mutant of mutants) await this.mutant(projectId, constructId, mutant);
  }

  private async construct(projectId: string, curator: string): Promise<string> {
    const { construct } = this.scenario;
    const first = {
      family: construct.family,
      organism: construct.organism,
      index: 0 as ScenarioResidue['index'],
    };
    const { proteinId } = await this.residue(projectId, first);
    const made = await this.as(curator, (id) =>
      this.container.constructService.make(id, projectId, {
        name: construct.name,
        dna: construct.text,
        codingStart: construct.codingStart + 1,
        circular: true,
        geneticCode: construct.geneticCode,
        proteinId,
      }),
    );
    return made.id;
  }

  private async mutant(projectId: string, constructId: string, mutant: Scenario['story']['mutants'][number]) {
    const refs = await Promise.all(mutant.mutations.map(({ residue }) => this.residue(projectId, residue)));
    const labels = await this.container.proteins.presentLabels(refs);
    const changes = mutant.mutations
      .map(({ oldLetter, newLetter }, at) => `${oldLetter}${labels[at]?.label}${newLetter}`)
      .join('+');
    const proteinId = refs[0]?.proteinId ?? '';
    const made = await this.as(mutant.author, (id) =>
      this.container.mutantService.make(id, projectId, {
        proteinId,
        changes,
        constructId,
        reason: mutant.reason,
      }),
    );
    await this.as(mutant.author, (id) =>
      this.container.mutantService.design(id, projectId, made.id, made.version, {
        constructId,
        host: 'ecoli',
      }),
    );
  }
}
