export { ChainLabel } from './chain-label.entity';
export { Chain } from './chain.entity';
export { StructureAccess } from './structure.access';
export { StructureRevision } from './structure-revision.entity';
export { Structure } from './structure.entity';
export { StructureQueries, type MapReader } from './structure.queries';
export { addStructureRoutes } from './structure.routes';
export { addStructure, type NewChain } from './structure.adding';
