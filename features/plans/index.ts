export { applyToConstructs, applyToMutant, applyToMutants, type MutantFilter } from './apply-plan-event';
export {
  downloadPrimerList,
  useChooseDesign,
  useConstructs,
  useDesign,
  useMakeConstruct,
  useMakeMutant,
  useMutant,
  useMutants,
} from './use-plans';
