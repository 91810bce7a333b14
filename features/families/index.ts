export { applyToFamilies, applyToProtein, applyToProteins } from './apply-family-event';
export {
  useFamilies,
  useMakeFamily,
  useProtein,
  useProteins,
  useRenameProtein,
  useSetOffsetNumbering,
} from './use-families';
export { familyOptions } from './family-options';
