import { watch } from 'node:fs';
import { join } from 'node:path';
import { claimStack } from './claim.mjs';
import { prepareDemo, welcome } from './demo-stack.mjs';
import { build, checkNode, installDependencies } from './ground.mjs';
import { runVerb } from './processes.mjs';
import { startProduct } from './product.mjs';
import { root, tool } from './root.mjs';

// The same product and data as `npm start`; a change to a source shows after a moment and a reload of the page.

await runVerb('demo', async (processes) => {
  checkNode();
  await claimStack(processes, 'demo');
  await installDependencies(processes);
  await build(processes);
  const environment = await prepareDemo(processes, { nodeEnv: 'development' });
  await watchSources(processes);
  const address = await startProduct(processes, environment, ['--watch', '--watch-preserve-output']);
  await welcome(address, environment.INBOX_URL);
  await processes.broken;
});

async function watchSources(processes) {
  await processes.start('tsc', [...tool('tsc'), '-b', '-w', '--preserveWatchOutput', 'graphql-api'], {
    cwd: root,
    ready: /Watching for file changes/,
  });
  regenerateOnChange(processes, ['graphql-api/dist', 'web/src']);
  await processes.start('vite', [...tool('vite', 'web'), 'build', '--watch'], {
    cwd: join(root, 'web'),
    ready: /built in/,
  });
}

/** Code generation writes only what differs, so its own output sets it off once more at most. */
function regenerateOnChange(processes, folders) {
  let waiting;
  let running = Promise.resolve();
  const regenerate = async () => {
    const { code, output } = await processes.run([process.execPath, 'scripts/codegen.mjs'], {
      cwd: root,
      quiet: true,
    });
    if (code !== 0 || !output.includes(' 0 generated files'))
      console.log(output.trim().replace(/^/gm, 'codegen | '));
  };
  for (const folder of folders) {
    watch(join(root, folder), { recursive: true }, () => {
      clearTimeout(waiting);
      waiting = setTimeout(() => (running = running.then(regenerate)), 300);
    });
  }
}
