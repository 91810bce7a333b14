export { ThreadPanel } from './components/thread-panel';
export { useResidueNames } from './use-residue-names';
