// The web client's bundler. Folders that are no part of the client are hidden, so that a stray import fails here.
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

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

// zod brings its messages in every language (40 kB gzipped); the product speaks English.
const isZod = (file) => file.includes(`${path.sep}node_modules${path.sep}zod${path.sep}`);
config.resolver.resolveRequest = (context, moduleName, platform) => {
  const english = /locales\/index\.(c?js)$/.test(moduleName) && isZod(context.originModulePath);
  const wanted = english ? moduleName.replace(/index\.(c?js)$/, 'en.$1') : moduleName;
  return context.resolveRequest(context, wanted, platform);
};

module.exports = config;
