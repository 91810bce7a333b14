export { Authenticate, type AccessClaims } from './authenticate';
export { errorHandler } from './error-handler';
export { securityHeaders } from './headers';
export { originAllowed } from './origin';
export { Routes } from './route';
export { serveClient } from './static-client';
