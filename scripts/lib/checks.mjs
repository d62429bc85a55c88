import { expoCli, expoEnvironment } from './expo.mjs';
import { inRoot } from './paths.mjs';
import { runNode } from './run.mjs';

const tool = (file, ...args) =>
  runNode([inRoot('node_modules', file), ...args], { title: file, lines: 400 });
const types = (project) => tool('typescript/bin/tsc', '--noEmit', '-p', project);
const folders = ['app', 'components', 'shared', 'server', 'openapi', 'tests', 'scripts'];

async function generated() {
  const env = { ...process.env, TSX_TSCONFIG_PATH: 'server/tsconfig.json' };
  await runNode(['--import', 'tsx', 'openapi/write.ts', '--check'], { env, title: 'openapi' });
}

async function typesOfApp() {
  const env = { ...expoEnvironment('development'), CI: '1' };
  await runNode([expoCli, 'customize', 'tsconfig.json'], { env, title: 'types of the routes' });
  await types('tsconfig.json');
}

/** Everything a reviewer would look at beside the tests: title and what throws when it is wrong. */
export const checks = {
  Format: () => tool('prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.'),
  'Generated = committed': generated,
  'Imports and cycles': () => tool('dependency-cruiser/bin/dependency-cruise.mjs', ...folders),
  'Dead code': () => tool('knip/bin/knip.js', '--no-progress'),
  'Types of the server': () => types('server/tsconfig.json'),
  'Types of the app': typesOfApp,
  'Types of the tests': () => types('tests/tsconfig.json'),
  Lint: () => tool('eslint/bin/eslint.js', '--max-warnings', '0', '.'),
};
