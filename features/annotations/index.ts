export { NewPin } from './components/new-pin';
export { PinsSection } from './components/pins-section';
