export { applyToStructure, applyToStructures } from './apply-structure-event';
export { StructureScreen } from './screens/structure-screen';
export { useStructure, useStructures } from './use-structures';
