import { inRoot } from './paths.mjs';
import { runNode } from './run.mjs';
import { step } from './steps.mjs';

const lastLine = (output) => output.trim().split('\n').at(-1);

/** Schema by the owner's role, then, outside production, the invented organizations. */
export async function prepareData(settings, env, entryArguments) {
  const entry = async (name, title) =>
    lastLine(await runNode(entryArguments(name), { env, title }));
  await step('Schema', () => entry('migrate', 'The migration'));
  if (settings.mode !== 'production') await step('Demo data', () => entry('seed', 'Seeding'));
}

/** `node …` arguments for an entry of the built server. */
export const builtEntry = (name) => [inRoot('dist', 'server', `${name}.js`)];
