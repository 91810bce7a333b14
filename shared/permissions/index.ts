export * from './can';
export * from './roles';
