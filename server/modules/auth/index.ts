export { addAuthRoutes } from './auth.routes';
export { AuthService } from './auth.service';
export { PeopleDirectory } from './people.directory';
export { Person } from './person.entity';
export { Session } from './session.entity';
export { SessionService } from './session.service';
export { SignInLimit } from './sign-in-limit';
