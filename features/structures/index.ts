export { applyToStructure, applyToStructures } from './apply-structure-event';
export { useStructure, useStructures } from './use-structures';
