// Plants forbidden imports and expects the linter's sentence; allowed ones pass in the same set-up.
import path from 'node:path';
import { ESLint } from 'eslint';
import { rooms } from '../../architecture.mjs';
import config from '../../eslint.config.mjs';

const root = path.resolve(__dirname, '../..');
const linter = new ESLint({ cwd: root, overrideConfigFile: true, baseConfig: config });

/** What the import rule says about a file with this code, as one string ('' when nothing). */
async function judge(file: string, code: string, rule = 'locant/imports'): Promise<string> {
  const [result] = await linter.lintText(code, { filePath: path.join(root, file) });
  const fatal = result?.messages.find((message) => message.fatal);
  if (result === undefined || fatal) throw new Error(fatal?.message ?? `not linted: ${file}`);
  return result.messages
    .filter(({ ruleId }) => ruleId === rule)
    .map(({ message }) => message)
    .join('\n');
}

interface Row {
  readonly file: string;
  readonly forbidden: readonly (readonly [code: string, sentence: RegExp])[];
  readonly allowed: readonly string[];
}

const frontDoor: Row['forbidden'][number] = ["import { X } from 'lucide-react-native';", /Import one icon/];

const machinery = {
  forbidden: [
    ["import { x } from '@/server/modules/threads';", /Machinery knows no module/],
    ["import { x } from '@/server/container';", /Machinery knows no module/],
    ["import { View } from 'react-native';", /may not import the package react-native/],
  ],
  allowed: ["import { x } from '@/server/lib/clock';", "import { x } from '@/shared/contracts/threads';"],
} satisfies Omit<Row, 'file'>;

const above = {
  forbidden: [
    ["import { x } from '@/server/modules/plans/plans.service';", /Use a module through its index/],
    ["import { x } from '@/client/api';", /may not import client\/api/],
  ],
  allowed: ["import { x } from '@/server/modules/plans';", "import { x } from '@/server/db/data-source';"],
} satisfies Omit<Row, 'file'>;

const table: Record<string, Row> = {
  'shared/sequence': {
    file: 'shared/sequence/planted.ts',
    forbidden: [
      ["import { x } from '@/shared/structure/model';", /The core stands alone/],
      ["import { readFile } from 'node:fs/promises';", /may not import Node's node:fs\/promises/],
      ["import { z } from 'zod';", /may not import the package zod/],
      ["export * from '../../client/api';", /shared\/sequence may not import client\/api/],
      ["const x = () => import('@/server/app');", /may not import server\/app/],
      ["type X = import('typeorm').DataSource;", /may not import the package typeorm/],
      ["const x = require('fs');", /may not import Node's fs/],
    ],
    allowed: ["import { x } from '@/shared/sequence/positions';", "import { x } from './alphabet';"],
  },
  'shared/structure': {
    file: 'shared/structure/pdb/planted.ts',
    forbidden: [
      ["import { x } from '@/shared/contracts/structures';", /The core stands alone/],
      ["import path from 'path';", /Node's path/],
    ],
    allowed: ["import { x } from '@/shared/sequence/positions';", "import { x } from '../model';"],
  },
  'shared/permissions': {
    file: 'shared/permissions/planted.ts',
    forbidden: [["import { x } from '@/shared/sequence/alphabet';", /depends on nothing/]],
    allowed: ["import { x } from './roles';"],
  },
  'shared/scenario': {
    file: 'shared/scenario/planted.ts',
    forbidden: [["import { x } from '@/shared/contracts/families';", /The generator is pure/]],
    allowed: ["import { x } from '@/shared/structure/model';"],
  },
  'shared/contracts': {
    file: 'shared/contracts/planted.ts',
    forbidden: [
      ["import { x } from '@/shared/scenario/demo';", /only declares what crosses the wire/],
      ["import express from 'express';", /may not import the package express/],
    ],
    allowed: ["import { z } from 'zod';", "import { x } from '@/shared/permissions/roles';"],
  },
  client: {
    file: 'client/planted.ts',
    forbidden: [
      ["import { x } from '@/server/app';", /Declare an endpoint in shared\/contracts/],
      ["import { x } from '@/features/threads';", /client may not import features\/threads/],
      ["import { DataSource } from 'typeorm';", /may not import the package typeorm/],
    ],
    allowed: ["import { x } from '@/shared/contracts/threads';", "import { io } from 'socket.io-client';"],
  },
  components: {
    file: 'components/ui/planted.tsx',
    forbidden: [
      ["import { x } from '@/client/api';", /Components take plain data and give events out/],
      ["import { Link } from 'expo-router';", /may not import the package expo-router/],
      ["import { x } from '@/features/threads';", /may not import features\/threads/],
    ],
    allowed: ["import { View } from 'react-native';", "import { x } from '@/components/theme/tokens';"],
  },
  'components/ui/link.tsx': {
    file: 'components/ui/link.tsx',
    forbidden: [["import { x } from '@/client/api';", /A link only follows the address/]],
    allowed: ["import { Link } from 'expo-router';", "import { x } from '@/components/theme';"],
  },
  'features/*': {
    file: 'features/plans/planted.tsx',
    forbidden: [
      ["import { x } from '@/features/threads/use-threads';", /Import another feature through its index/],
      ["import { x } from '../threads/components/message';", /Import another feature through its index/],
      ["import { x } from '@/server/modules/plans';", /may not import server\/modules\/plans/],
      ["import { x } from '@/app/index';", /may not import app\/index/],
    ],
    allowed: [
      "import { x } from '@/features/threads';",
      "import { x } from '@/features/plans/use-plans';",
      "import { x } from '@/client/api';",
    ],
  },
  app: {
    file: 'app/planted.tsx',
    forbidden: [
      ["import { x } from '@/features/plans/plan-screen';", /app holds addresses only/],
      ["import { x } from '@/shared/contracts/plans';", /app holds addresses only/],
    ],
    allowed: ["export { PlanScreen as default } from '@/features/plans';"],
  },
  'server/lib': {
    file: 'server/lib/planted.ts',
    forbidden: [["import { x } from '@/server/db/data-source';", /server\/lib is the ground floor/]],
    allowed: [
      "import { x } from '@/shared/sequence/positions';",
      "import { createHash } from 'node:crypto';",
    ],
  },
  'server/http': { file: 'server/http/planted.ts', ...machinery },
  'server/db': { file: 'server/db/planted.ts', ...machinery },
  'server/mail': { file: 'server/mail/planted.ts', ...machinery },
  'server/storage': { file: 'server/storage/planted.ts', ...machinery },
  'server/modules/*': {
    file: 'server/modules/plans/planted.ts',
    forbidden: [
      [
        "import { x } from '@/server/modules/threads/threads.entity';",
        /Ask another module through its index/,
      ],
      ["import { x } from '../threads/threads.service';", /Ask another module through its index/],
      ["import { x } from '@/server/realtime/publisher';", /announce instead of importing realtime/],
    ],
    allowed: [
      "import { x } from '@/server/modules/threads';",
      "import { x } from './plans.entity';",
      "import { x } from '@/server/db/unit-of-work';",
    ],
  },
  'server/realtime': { file: 'server/realtime/planted.ts', ...above },
  'server/jobs': { file: 'server/jobs/planted.ts', ...above },
  server: {
    file: 'server/planted.ts',
    forbidden: [["import { x } from '@/features/plans';", /The server knows no screen/]],
    allowed: ["import { x } from '@/server/modules/plans/plans.entity';", "import { x } from './env';"],
  },
  cli: {
    file: 'cli/planted.ts',
    forbidden: [
      ["import { x } from '@/server/lib/clock';", /The command line only reads files/],
      ["import { z } from 'zod';", /may not import the package zod/],
    ],
    allowed: ["import { x } from '@/shared/structure/model';", "import { parseArgs } from 'node:util';"],
  },
  scripts: {
    file: 'scripts/planted.mjs',
    forbidden: [
      ["import mysql from 'mysql2/promise';", /Scripts run before anything is installed/],
      ["import { x } from '../shared/sequence/alphabet';", /scripts may not import shared/],
    ],
    allowed: ["import { x } from './lib/places.mjs';", "import { spawn } from 'node:child_process';"],
  },
  'stand-ins': {
    file: 'stand-ins/planted.tsx',
    forbidden: [
      ["import { color } from '@/components/theme';", /leans on nothing of ours/],
      ["import { View } from 'react-native';", /may not import the package react-native/],
    ],
    allowed: ["import { Fragment } from 'react';", "import { Navigator } from './left-out';"],
  },
  tests: { file: 'tests/planted.ts', forbidden: [frontDoor], allowed: ["import { x } from '@/server/app';"] },
  bench: { file: 'bench/planted.ts', forbidden: [frontDoor], allowed: ["import { x } from '@/app/index';"] },
};

test('every row of the import table is tried here', () => {
  expect(Object.keys(table).sort()).toEqual(rooms.map(({ room }: { room: string }) => room).sort());
});

describe.each(Object.entries(table))('%s', (_room, { file, forbidden, allowed }) => {
  test.each(forbidden)('is told what to do instead of: %s', async (code, sentence) => {
    expect(await judge(file, code)).toMatch(sentence);
  });
  test.each(allowed)('may say: %s', async (code) => {
    expect(await judge(file, code)).toBe('');
  });
});

test.each(Object.values(table).filter(({ file }) => !/^(tests|bench)\//.test(file)))(
  'nothing imports tests, bench, or the entry points ($file)',
  async ({ file }) => {
    const targets = ['tests/support/x', 'bench/x', 'app/x', 'cli/x', 'scripts/x'];
    for (const target of targets.filter((name) => !file.startsWith(`${name.split('/')[0]}/`))) {
      expect(await judge(file, `import '@/${target}';`)).toContain(`may not import ${target}`);
    }
  },
);

test('three belongs to the structure canvas, and icons come one by one', async () => {
  expect(await judge('features/structures/planted.tsx', "import { Mesh } from 'three';")).toMatch(
    /every page/,
  );
  expect(await judge('components/structure-canvas/planted.ts', "import { Mesh } from 'three';")).toBe('');
  expect(await judge('components/ui/planted.tsx', "import { X } from 'lucide-react-native';")).toMatch(
    /one icon/,
  );
  expect(await judge('components/ui/planted.tsx', "import X from 'lucide-react-native/icons/x';")).toBe('');
});

test('transactions are opened in server/db only', async () => {
  const rule = 'no-restricted-syntax';
  for (const code of ['source.transaction(async () => {});', 'source.createQueryRunner();']) {
    expect(await judge('server/modules/plans/plans.service.ts', code, rule)).toMatch(/unit of work/);
    expect(await judge('server/container.ts', code, rule)).toMatch(/unit of work/);
    expect(await judge('server/db/unit-of-work.ts', code, rule)).toBe('');
  }
});

test('the core asks no clock, no chance and no network', async () => {
  const file = 'shared/sequence/planted.ts';
  for (const code of ['Math.random();', 'Date.now();', 'new Date();']) {
    expect(await judge(file, code, 'no-restricted-syntax')).toMatch(/The core is pure/);
  }
  expect(await judge(file, "fetch('/x');", 'no-restricted-globals')).toMatch(/The core is pure/);
});

test('any is refused, and so is switching a rule off in place', async () => {
  const rule = '@typescript-eslint/no-explicit-any';
  const code = `// eslint-disable-next-line ${rule}\nexport const x = (y: any) => String(y);`;
  expect(await judge('client/planted.ts', code, rule)).toMatch(/Unexpected any/);
});

test('a file of more than 300 lines is refused, unless it holds data or tests', async () => {
  const code = 'export {};\n'.repeat(301);
  expect(await judge('client/planted.ts', code, 'max-lines')).toMatch(/too many lines/);
  expect(await judge('shared/sequence/planted.data.ts', code, 'max-lines')).toBe('');
  expect(await judge('tests/client/planted.test.ts', code, 'max-lines')).toBe('');
});
