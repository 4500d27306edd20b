import { existsSync, readdirSync } from 'node:fs';
import { basename, join } from 'node:path';
import { build, checkNode, compile, installDependencies, step } from './ground.mjs';
import { runVerb } from './processes.mjs';
import { root } from './root.mjs';

// Runs the benches of the kernels, graphql-api/kernels/*/bench/*.bench.mjs, and of the started product,
// scripts/bench/*.bench.mjs; `npm run bench -- frontier` runs frontier.bench.mjs alone, and hands it what follows:
// `npm run bench -- frontier T7 --seed 5`.

const [wanted, ...args] = process.argv.slice(2);

await runVerb('bench', async (processes) => {
  checkNode();
  await installDependencies(processes);
  const chosen = benches().filter((path) => !wanted || basename(path) === `${wanted}.bench.mjs`);
  if (chosen.some((path) => basename(path) === 'web.bench.mjs')) await build(processes);
  else await step('Build: API and kernels', () => compile(processes));
  let failures = 0;
  for (const bench of chosen) {
    console.log(`\n${bench}`);
    const { code } = await processes.run([process.execPath, bench, ...args], { cwd: root });
    if (code !== 0) failures += 1;
  }
  return failures === 0 ? 0 : 1;
});

function benches() {
  const kernels = 'graphql-api/kernels';
  return [...readdirSync(join(root, kernels)).map((kernel) => `${kernels}/${kernel}/bench`), 'scripts/bench']
    .filter((folder) => existsSync(join(root, folder)))
    .flatMap((folder) => readdirSync(join(root, folder)).map((file) => `${folder}/${file}`))
    .filter((path) => path.endsWith('.bench.mjs'));
}
