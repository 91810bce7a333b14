export { LateLocatorBox as LocatorBox } from './components/late-locator-box';
