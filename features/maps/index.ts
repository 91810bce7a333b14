export { applyToMap } from './apply-map-event';
export { useConfirmReady, useDecideMap } from './use-maps';
