export { ProjectAccess, type Membership } from './project.access';
export { ProjectMember } from './project-member.entity';
export { Project } from './project.entity';
export { ProjectQueries } from './project.queries';
export { addProjectRoutes } from './project.routes';
export { ProjectService, type ProjectFurnisher } from './project.service';
