export { applyToMap } from './apply-map-event';
export {
  countOf,
  groupChains,
  mismatchCount,
  runnerUp,
  standings,
  type ChainGroup,
  type Standing,
} from './chain-groups';
export { ChainDecision } from './components/chain-decision';
export { CoverageStrip } from './components/coverage-strip';
export { MapExceptions } from './components/map-exceptions';
export { StandingMark } from './components/standing-mark';
export { authorShift, percentWords, shiftWords, stretchWords } from './map-words';
export { preferredLabel } from './preferred-label';
export { useDecideChains, type DecideChains, type MapDecision } from './use-decide-chains';
export { useConfirmReady, useDecideMap } from './use-maps';
