export { countOf, groupChains, mismatchCount, runnerUp, standings, type ChainGroup } from './chain-groups';
export { ChainDecision } from './components/chain-decision';
export { CoverageStrip } from './components/coverage-strip';
export { MapExceptions } from './components/map-exceptions';
export { StandingMark } from './components/standing-mark';
export { authorShift, percentWords, shiftWords, stretchWords } from './map-words';
export { useDecideChains, type DecideChains } from './use-decide-chains';
export { useConfirmReady } from './use-maps';
