// The web client's bundler. Folders that are no part of the client are hidden, so that a stray import fails here.
const { createHash } = require('node:crypto');
const { readFileSync } = require('node:fs');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');
const leftOut = require('./metro.left-out.cjs');

const config = getDefaultConfig(__dirname);

const hidden = [
  '.data',
  '.git',
  '.ci',
  'bench',
  'cli',
  'coverage',
  'dist',
  'docs',
  'scripts',
  'server',
  'tests',
];
const escape = (text) => text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');
const ownFolders = hidden.map((name) => new RegExp(`^${escape(path.join(__dirname, name) + path.sep)}.*`));
config.resolver.blockList = [].concat(config.resolver.blockList ?? [], ownFolders);

// What app.json says is written into a module that the bundler keeps from build to build: another app.json, another one.
const appSettings = readFileSync(path.join(__dirname, 'app.json'));
config.cacheVersion = `${config.cacheVersion}-${createHash('sha256').update(appSettings).digest('hex').slice(0, 16)}`;

// The development server leaves nothing out: its notes and error pages are made of such parts.
const standIns = new Map(
  leftOut.flatMap((part) =>
    part.files.map((file) => [
      path.join(__dirname, 'node_modules', part.package, file),
      path.join(__dirname, 'stand-ins', part.standIn),
    ]),
  ),
);
const standInFor = (context, found) =>
  context.dev || found.type !== 'sourceFile' ? undefined : standIns.get(found.filePath);

// zod brings its messages in every language (40 kB gzipped); the product speaks English.
const isZod = (file) => file.includes(`${path.sep}node_modules${path.sep}zod${path.sep}`);
config.resolver.resolveRequest = (context, moduleName, platform) => {
  const english = /locales\/index\.(c?js)$/.test(moduleName) && isZod(context.originModulePath);
  const wanted = english ? moduleName.replace(/index\.(c?js)$/, 'en.$1') : moduleName;
  const found = context.resolveRequest(context, wanted, platform);
  const standIn = standInFor(context, found);
  return standIn ? { ...found, filePath: standIn } : found;
};

module.exports = config;
