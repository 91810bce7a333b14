export { useMutants } from './use-plans';
