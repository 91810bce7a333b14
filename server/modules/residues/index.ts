export { AddressLookup } from './address.lookup';
export { CopyQueries } from './copy.queries';
export { LocateQueries } from './locate.queries';
export { PassportQueries } from './passport.queries';
export { addResidueRoutes } from './residue.routes';
export { SiteQueries } from './site.queries';
