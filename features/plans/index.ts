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
export { ConstructScreen } from './screens/construct-screen';
export { MutantScreen } from './screens/mutant-screen';
export { NewConstructScreen } from './screens/new-construct-screen';
export { NewMutantScreen } from './screens/new-mutant-screen';
export { PlanScreen } from './screens/plan-screen';
