// Who may import whom, as data. The linter reads this table (eslint.config.mjs), the test plants a forbidden
// import for each row (tests/lint/import-table.test.ts). The most specific room of a file counts.

const serverPackages = [
  '@node-rs/argon2',
  'compression',
  'csv-stringify',
  'express',
  'helmet',
  'jsonwebtoken',
  'multer',
  'mysql2',
  'pino',
  'pino-http',
  'piscina',
  'rate-limiter-flexible',
  'reflect-metadata',
  'socket.io',
  'typeorm',
];
const screenPackages = ['expo', 'expo-*', 'react', 'react-*', 'lucide-react-native', 'downshift', 'three'];
const addressesAndServer = ['expo-router', '@tanstack/react-query', 'socket.io-client'];

const coreAdvice =
  'The core stands alone: take plain data as a parameter, or move what you need into the core.';
const clientAdvice = 'Declare an endpoint in shared/contracts and call it through client/api.';
const moduleAdvice = 'Ask another module through its index; announce instead of importing realtime.';

/**
 * - `mayImport`: rooms (a name ending in `#index` means: only that room's index). A room may always import itself.
 * - `packages`: 'none', a list of the only ones allowed, or { not: [...] }; `*` at the end stands for any ending.
 * - `node`: whether Node's own modules may be imported.
 */
export const rooms = [
  { room: 'shared/sequence', mayImport: [], packages: 'none', node: false, advice: coreAdvice },
  {
    room: 'shared/structure',
    mayImport: ['shared/sequence'],
    packages: 'none',
    node: false,
    advice: coreAdvice,
  },
  {
    room: 'shared/permissions',
    mayImport: [],
    packages: 'none',
    node: false,
    advice: 'The permission table depends on nothing: pass roles and actions in as values.',
  },
  {
    room: 'shared/scenario',
    mayImport: ['shared/sequence', 'shared/structure'],
    packages: 'none',
    node: false,
    advice: 'The generator is pure: let the caller write files, ask clocks and seed it.',
  },
  {
    room: 'shared/contracts',
    mayImport: ['shared/permissions', 'shared/sequence', 'shared/structure'],
    packages: ['zod'],
    node: false,
    advice: 'A contract only declares what crosses the wire: behaviour belongs to client or server.',
  },
  {
    room: 'client',
    mayImport: ['shared/*'],
    packages: { not: serverPackages },
    node: false,
    advice: clientAdvice,
  },
  {
    room: 'components',
    mayImport: ['shared/*'],
    packages: { not: [...serverPackages, ...addressesAndServer] },
    node: false,
    advice: 'Components take plain data and give events out: load and navigate in a feature.',
  },
  {
    // The one component that knows the router: an anchor that navigates without loading the page again.
    room: 'components/ui/link.tsx',
    mayImport: ['components', 'shared/*'],
    packages: { not: [...serverPackages, '@tanstack/react-query', 'socket.io-client'] },
    node: false,
    advice: 'A link only follows the address it is given.',
  },
  {
    room: 'features/*',
    mayImport: ['components', 'client', 'shared/*', 'features/*#index'],
    packages: { not: serverPackages },
    node: false,
    advice: `Import another feature through its index. ${clientAdvice}`,
  },
  {
    // A screen is imported by its own file: through an index every page would load the screens of all.
    room: 'app',
    mayImport: ['features/*#index', 'features/*/screens', 'components', 'client'],
    packages: { not: serverPackages },
    node: false,
    advice: 'app holds addresses only: re-export a screen from its own file.',
  },
  {
    room: 'server/lib',
    mayImport: ['shared/*'],
    packages: { not: screenPackages },
    node: true,
    advice: 'server/lib is the ground floor: take what you need as a parameter.',
  },
  ...['http', 'db', 'mail', 'storage'].map((name) => ({
    room: `server/${name}`,
    mayImport: ['server/lib', 'shared/*'],
    packages: { not: screenPackages },
    node: true,
    advice: 'Machinery knows no module: let server/container.ts or the module hand it in.',
  })),
  {
    room: 'server/modules/*',
    mayImport: [
      ...['http', 'db', 'lib', 'mail', 'storage'].map((name) => `server/${name}`),
      'shared/*',
      'server/modules/*#index',
    ],
    packages: { not: screenPackages },
    node: true,
    advice: moduleAdvice,
  },
  ...['realtime', 'jobs'].map((name) => ({
    room: `server/${name}`,
    mayImport: [
      'server/modules/*#index',
      ...['db', 'http', 'lib', 'mail', 'storage'].map((other) => `server/${other}`),
      'shared/*',
    ],
    packages: { not: screenPackages },
    node: true,
    advice: "Use a module through its index; what both need belongs to the module's index or to server/lib.",
  })),
  {
    room: 'server',
    mayImport: ['server/**', 'shared/*'],
    packages: { not: screenPackages },
    node: true,
    advice: 'The server knows no screen: share what both sides need in shared/contracts.',
  },
  {
    room: 'cli',
    mayImport: ['shared/*'],
    packages: 'none',
    node: true,
    advice: "The command line only reads files and calls the core: use Node's own modules.",
  },
  {
    room: 'scripts',
    mayImport: [],
    packages: 'none',
    node: true,
    advice: "Scripts run before anything is installed: use Node's own modules.",
  },
  {
    // What the bundler puts in the place of parts that the client leaves out (metro.left-out.cjs).
    room: 'stand-ins',
    mayImport: [],
    packages: ['react'],
    node: false,
    advice: 'A stand-in takes the place of a part of a package: it leans on nothing of ours.',
  },
  { room: 'tests', mayImport: ['**'], packages: { not: [] }, node: true, advice: '' },
  { room: 'bench', mayImport: ['**'], packages: { not: [] }, node: true, advice: '' },
];

/** Packages with a rule of their own. `onlyIn` names rooms or folders; `deepOnly` forbids the front door. */
export const packageRules = [
  {
    name: 'three',
    onlyIn: ['components/structure-canvas', 'tests', 'bench'],
    advice: 'Import three only in components/structure-canvas, or every page loads it.',
  },
  {
    name: 'lucide-react-native',
    deepOnly: 'lucide-react-native/icons/',
    advice: "Import one icon: 'lucide-react-native/icons/<name>'; the front door ships all of them.",
  },
];
