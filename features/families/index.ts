export { useFamilies, useMakeFamily, useProtein, useProteins } from './use-families';
export { familyOptions } from './family-options';
