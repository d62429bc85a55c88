import { inRoot } from './paths.mjs';
import { runNode } from './run.mjs';
import { step } from './steps.mjs';

const lastLine = (output) => output.trim().split('\n').at(-1);

/** Schema by the owner's role, then, outside production, the invented organizations. */
export async function prepareData(settings, env, nodeArguments) {
  await step('Schema', async () => lastLine(await runNode(nodeArguments('migrate'), { env })));
  if (settings.mode === 'production') return;
  await step('Demo data', async () => lastLine(await runNode(nodeArguments('seed'), { env })));
}

/** `node …` arguments for an entry of the built server. */
export const builtEntry = (name) => [inRoot('dist', 'server', `${name}.js`)];
