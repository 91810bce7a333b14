// The router makes this stack when it starts and never shows it (metro.left-out.cjs).
import { Navigator } from './left-out';

export const createNativeStackNavigator = () => ({ Navigator });
