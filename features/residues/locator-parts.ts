// What is fetched after the page: the locator with its list. Only late-parts.ts asks for it, as another import of one of
// these would bring them into the first load.
export { LocatePage } from './components/locate-page';
export { LocatorBox } from './components/locator-box';
