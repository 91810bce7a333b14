import { createServer, type Server as HttpServer } from 'node:http';
import path from 'node:path';
import { Router, type Express } from 'express';
import type { DataSource } from 'typeorm';
import { createApp } from './app';
import { createDataSource, UnitOfWork } from './db';
import type { Env } from './env';
import { Authenticate, Routes } from './http';
import { JobQueue, JobRunner, readAlignmentJob, readStructureJob, WorkerPool } from './jobs';
import type { Logger } from './lib/log';
import { moduleEntities } from './module-entities';
import * as alignments from './modules/alignments';
import * as annotations from './modules/annotations';
import { addAuditRoutes } from './modules/audit';
import * as auth from './modules/auth';
import * as families from './modules/families';
import * as maps from './modules/maps';
import * as plans from './modules/plans';
import * as projects from './modules/projects';
import * as residues from './modules/residues';
import * as structures from './modules/structures';
import * as teams from './modules/teams';
import * as threads from './modules/threads';
import * as uploads from './modules/uploads';
import { Live } from './realtime';
import { FileStore } from './storage';
import { subjectResolvers } from './subject-resolvers';

export type Container = Awaited<ReturnType<typeof createContainer>>;

/** Builds everything once, by hand, in the order in which the parts need each other. */
export async function createContainer(env: Env, log: Logger) {
  const source: DataSource = createDataSource(env.DATABASE_URL, moduleEntities);
  await source.initialize();
  const unitOfWork = new UnitOfWork(source);
  const allowedOrigins = env.ALLOWED_ORIGINS.split(',').filter(Boolean);
  const sessions = new auth.SessionService(unitOfWork);
  const authenticate = new Authenticate(env.TOKEN_SECRET, sessions.isOpen.bind(sessions));
  const api = Router({ caseSensitive: true });
  const routes = new Routes(api, authenticate);
  const files = new FileStore(env.DATA_DIR);

  const people = new auth.PeopleDirectory(unitOfWork);
  const authService = new auth.AuthService(unitOfWork);
  const teamDirectory = new teams.TeamDirectory(unitOfWork);
  const teamService = new teams.TeamService(unitOfWork);
  const access = new projects.ProjectAccess(unitOfWork);
  const projectQueries = new projects.ProjectQueries(unitOfWork, people, teamDirectory);
  const projectService = new projects.ProjectService(
    unitOfWork,
    access,
    people,
    teamDirectory,
    families.furnishFamilies,
  );

  const familyAccess = new families.FamilyAccess(unitOfWork, access);
  const familyQueries = new families.FamilyQueries(unitOfWork);
  const familyService = new families.FamilyService(unitOfWork, access, familyQueries);
  const proteins = new families.ProteinDirectory(unitOfWork);
  const proteinService = new families.ProteinService(unitOfWork, familyAccess, familyQueries, familyService);

  const alignmentQueries = new alignments.AlignmentQueries(unitOfWork, people, proteins);
  const mapQueries = new maps.MapQueries(unitOfWork, people, proteins);
  const structureAccess = new structures.StructureAccess(unitOfWork, access);
  const structureQueries = new structures.StructureQueries(unitOfWork, people, mapQueries);
  const uploadQueries = new uploads.UploadQueries(unitOfWork, people, files);
  const uploadStates = new uploads.UploadStates(uploadQueries, mapQueries);

  const sites = new residues.SiteQueries(unitOfWork);
  const passports = new residues.PassportQueries(
    unitOfWork,
    proteins,
    sites,
    new residues.CopyQueries(unitOfWork),
  );
  const locate = new residues.LocateQueries(unitOfWork, proteins, new residues.AddressLookup(unitOfWork));

  const annotationAccess = new annotations.AnnotationAccess(unitOfWork, access);
  const annotationQueries = new annotations.AnnotationQueries(unitOfWork, people, proteins, sites);
  const annotationService = new annotations.AnnotationService(
    unitOfWork,
    access,
    annotationAccess,
    proteins,
    annotationQueries,
  );

  const planAccess = new plans.PlanAccess(unitOfWork, access);
  const planQueries = new plans.PlanQueries(unitOfWork, people, proteins);
  const constructService = new plans.ConstructService(unitOfWork, access, proteins, planQueries);
  const mutantService = new plans.MutantService(unitOfWork, access, planAccess, proteins, planQueries);

  const subjects = new threads.SubjectDirectory(
    subjectResolvers(unitOfWork, proteins, annotationQueries, planQueries),
  );
  const threadQueries = new threads.ThreadQueries(unitOfWork, people, subjects);
  const threadService = new threads.ThreadService(unitOfWork, access, subjects, threadQueries);

  const clientFolder = path.resolve(process.env.CLIENT_DIR ?? 'dist');
  const isReady = async () =>
    source.query('SELECT 1').then(
      () => true,
      () => false,
    );
  const app: Express = createApp(api, clientFolder, log, isReady);
  const http: HttpServer = createServer(app);
  const live = new Live(http, {
    authenticate,
    sessions,
    people,
    access,
    queries: projectQueries,
    allowedOrigins,
    log,
  });
  unitOfWork.onCommitted((events) => live.publish(events));

  const pool = new WorkerPool(env.WORKER_MEMORY_MB);
  const upload = { unitOfWork, files, states: uploadStates, pool, onProgress: live.hintProgress.bind(live) };
  const jobs = new JobRunner(
    new JobQueue(unitOfWork, env.JOB_LEASE_SECONDS * 1000),
    {
      [uploads.uploadJobKinds.alignment]: readAlignmentJob({
        ...upload,
        families: familyService,
        alignments: alignmentQueries,
      }),
      [uploads.uploadJobKinds.structure]: readStructureJob({
        ...upload,
        proteins,
        structures: structureQueries,
      }),
    },
    log,
  );
  const uploadService = new uploads.UploadService(
    unitOfWork,
    access,
    familyAccess,
    files,
    uploadQueries,
    () => jobs.wake(),
  );
  const mapService = new maps.MapService(
    unitOfWork,
    structureAccess,
    new maps.DecisionPlanner(unitOfWork, familyAccess, proteins, pool.mapChain.bind(pool)),
    mapQueries,
    structureQueries,
    familyService,
    (unit, revisionId) => uploadStates.settle(unit, revisionId),
  );

  auth.addAuthRoutes(routes, {
    authenticate,
    service: authService,
    sessions,
    limit: new auth.SignInLimit(env.SIGN_IN_ATTEMPTS),
    allowedOrigins,
    onClosed: (familyId) => {
      authenticate.forget(familyId);
      live.cutSession(familyId);
    },
  });
  teams.addTeamRoutes(routes, teamService);
  projects.addProjectRoutes(routes, access, projectService, projectQueries, teamDirectory);
  families.addFamilyRoutes(routes, {
    projects: access,
    access: familyAccess,
    queries: familyQueries,
    service: familyService,
    proteins: proteinService,
  });
  uploads.addUploadRoutes(
    routes,
    access,
    uploadQueries,
    uploadService,
    uploads.receiveUpload(files, env.UPLOAD_LIMIT_MB * 1_000_000),
  );
  alignments.addAlignmentRoutes(routes, access, alignmentQueries);
  structures.addStructureRoutes(routes, access, structureAccess, structureQueries);
  maps.addMapRoutes(routes, mapService);
  residues.addResidueRoutes(routes, access, passports, locate);
  annotations.addAnnotationRoutes(routes, {
    projects: access,
    access: annotationAccess,
    service: annotationService,
    queries: annotationQueries,
    proteins,
  });
  threads.addThreadRoutes(routes, access, threadService, threadQueries);
  plans.addPlanRoutes(routes, {
    projects: access,
    access: planAccess,
    constructs: constructService,
    mutants: mutantService,
    queries: planQueries,
  });
  addAuditRoutes(routes, unitOfWork, access, people);

  return {
    source,
    unitOfWork,
    app,
    http,
    live,
    jobs,
    routes,
    people,
    authService,
    teamService,
    projectService,
    proteinService,
    uploadService,
    mapService,
    annotationService,
    threadService,
    constructService,
    mutantService,
    uploadQueries,
    structureQueries,
    mapQueries,
    familyQueries,
    proteins,
    files,
    async close() {
      await live.close();
      await jobs.stop();
      await pool.close();
      await source.destroy();
    },
  };
}
