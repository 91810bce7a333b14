export { addMaps, type NewMap } from './map.adding';
export { MapCandidate } from './map-candidate.entity';
export { MapQueries } from './map.queries';
export { addMapRoutes } from './map.routes';
export { MapSegment } from './map-segment.entity';
export { DecisionPlanner } from './map.planner';
export { MapService } from './map.service';
export type { MappedChain } from './chain-mapper';
export { ResidueMap } from './residue-map.entity';
