import { maps } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { MapService } from './map.service';

export function addMapRoutes(routes: Routes, service: MapService): void {
  routes.add(maps.decide, ({ personId, params, version, body }) =>
    service.decide(personId, params.projectId, params.chainId, version, body),
  );
  routes.add(maps.confirmReady, ({ personId, params }) =>
    service.confirmReady(personId, params.projectId, params.structureId),
  );
}
