// The lint rule that holds the import table of architecture.mjs.
import { builtinModules } from 'node:module';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { packageRules, rooms } from './architecture.mjs';

const root = path.dirname(fileURLToPath(import.meta.url));
const toPattern = (glob) =>
  new RegExp(
    `^${glob.replace(/[.*]+/g, (part) => ({ '**': '.+', '*': '[^/]+' })[part] ?? `\\${part}`)}(?=/|$)`,
  );
const tidy = (file) => file.split(path.sep).join('/');

// Longest name first, so that server/db counts before server.
const byLength = [...rooms]
  .sort((a, b) => b.room.length - a.room.length)
  .map((row) => ({ ...row, pattern: toPattern(row.room) }));

/** The room of a path relative to the root: its row, and its concrete name (`features/plans`), or null. */
export function roomOf(file) {
  for (const row of byLength) {
    const match = row.pattern.exec(file);
    if (match !== null) return { row, name: match[0] };
  }
  return null;
}

/** What is wrong with this import, as a sentence that says what to do instead; null when it is allowed. */
export function judgeImport(importer, specifier) {
  const from = roomOf(importer);
  if (specifier.startsWith('.') || specifier.startsWith('@/')) {
    const target = specifier.startsWith('.')
      ? tidy(path.posix.join(path.posix.dirname(importer), specifier))
      : specifier.slice(2);
    return from === null ? null : judgePath(from, target);
  }
  return judgeOwnRule(importer, specifier) ?? (from === null ? null : judgePackage(from, specifier));
}

function judgePath(from, target) {
  const to = roomOf(target);
  if (to !== null && to.name === from.name) return null;
  const allowed = from.row.mayImport.some((entry) => {
    const [glob, door] = entry.split('#');
    const match = toPattern(glob).exec(target);
    if (match === null) return false;
    const rest = target.slice(match[0].length);
    return door === undefined || rest === '' || /^\/index(\.tsx?)?$/.test(rest);
  });
  if (allowed) return null;
  const may = from.row.mayImport.map((entry) => entry.replace('#index', "'s index")).join(', ');
  return `${from.name} may not import ${target} (allowed: itself${may && `, ${may}`}). ${from.row.advice}`;
}

function judgePackage(from, specifier) {
  const { node, packages, advice } = from.row;
  if (specifier.startsWith('node:') || builtinModules.includes(specifier)) {
    return node ? null : `${from.name} may not import Node's ${specifier}. ${advice}`;
  }
  const isListed = (list) =>
    list.some((name) =>
      name.endsWith('*')
        ? specifier.startsWith(name.slice(0, -1))
        : specifier === name || specifier.startsWith(`${name}/`),
    );
  const allowed =
    packages === 'none' ? false : Array.isArray(packages) ? isListed(packages) : !isListed(packages.not);
  return allowed ? null : `${from.name} may not import the package ${specifier}. ${advice}`;
}

function judgeOwnRule(importer, specifier) {
  for (const { name, onlyIn, deepOnly, advice } of packageRules) {
    if (specifier !== name && !specifier.startsWith(`${name}/`)) continue;
    if (onlyIn && !onlyIn.some((place) => importer.startsWith(`${place}/`))) return advice;
    if (deepOnly && !specifier.startsWith(deepOnly)) return advice;
  }
  return null;
}

export const importsRule = {
  meta: { type: 'problem', schema: [], messages: { forbidden: '{{sentence}}' } },
  create(context) {
    const importer = tidy(path.relative(root, context.filename));
    const check = (node) => {
      if (node?.type !== 'Literal' || typeof node.value !== 'string') return;
      const sentence = judgeImport(importer, node.value);
      if (sentence !== null) context.report({ node, messageId: 'forbidden', data: { sentence } });
    };
    return {
      ImportDeclaration: (node) => check(node.source),
      ExportNamedDeclaration: (node) => check(node.source),
      ExportAllDeclaration: (node) => check(node.source),
      ImportExpression: (node) => check(node.source),
      TSImportType: (node) => check(node.source),
      TSExternalModuleReference: (node) => check(node.expression),
      CallExpression: (node) => {
        if (node.callee.type === 'Identifier' && node.callee.name === 'require') check(node.arguments[0]);
      },
    };
  },
};
