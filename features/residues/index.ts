export { LocatorBox } from './components/locator-box';
export { applyToLocated, applyToPassport } from './apply-residue-event';
export { useLocate, usePassport } from './use-residues';
