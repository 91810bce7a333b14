export { useStructures } from './use-structures';
