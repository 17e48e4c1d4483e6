import { fileURLToPath } from 'node:url';
import { ensurePackages } from '../server/cli/start/ensure-packages.mjs';
import { nodeProblem } from '../server/cli/start/node-problem.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));

const stopWith = (sentence) => {
  console.log(sentence);
  console.log('0 passed, 1 failed');
  process.exit(1);
};

process.chdir(root);

const unfit = nodeProblem();
if (unfit) stopWith(unfit);

try {
  await ensurePackages(root, (line) => console.log(line));
} catch (error) {
  stopWith(error.message);
}

// The rest is TypeScript; tsx is a package, so it can be asked for only now.
const { register } = await import('tsx/esm/api');
register();
await import('./run/main.ts');
