import * as alignments from './modules/alignments';
import * as annotations from './modules/annotations';
import * as auth from './modules/auth';
import * as families from './modules/families';
import * as maps from './modules/maps';
import * as plans from './modules/plans';
import * as projects from './modules/projects';
import * as structures from './modules/structures';
import * as teams from './modules/teams';
import * as threads from './modules/threads';
import * as uploads from './modules/uploads';

/** Every table of the modules, for the data source and for drafting migrations. */
export const moduleEntities = [
  auth.Person,
  auth.Session,
  teams.Team,
  teams.TeamMember,
  projects.Project,
  projects.ProjectMember,
  families.Family,
  families.Protein,
  families.Numbering,
  families.NumberingSegment,
  uploads.Upload,
  alignments.Alignment,
  alignments.AlignmentRevision,
  alignments.AlignmentRow,
  alignments.AlignmentSegment,
  structures.Structure,
  structures.StructureRevision,
  structures.Chain,
  structures.ChainLabel,
  maps.ResidueMap,
  maps.MapSegment,
  maps.MapCandidate,
  annotations.Annotation,
  annotations.AnnotationVersion,
  annotations.Pin,
  threads.Thread,
  threads.Message,
  plans.Construct,
  plans.ConstructRevision,
  plans.Mutant,
  plans.Mutation,
  plans.Design,
  plans.Primer,
];
